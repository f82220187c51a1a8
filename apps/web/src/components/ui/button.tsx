import type { ComponentProps } from 'react';
import { buttonStyle } from './button-style.ts';
import type { ButtonKind } from './button-style.ts';
import { classNames } from './class-names.ts';
import { Spinner } from './spinner.tsx';

export interface ButtonProps extends ComponentProps<'button'> {
  kind?: ButtonKind | undefined;
  small?: boolean | undefined;
  /** Work is underway: the button keeps its place and focus, and does nothing more. */
  busy?: boolean | undefined;
}

export function Button({ kind, small, busy = false, className, children, onClick, ...rest }: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
      className={classNames(buttonStyle(kind, small), className)}
    >
      {busy && <Spinner />}
      {children}
    </button>
  );
}
