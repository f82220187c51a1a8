import { useId } from 'react';
import type { ComponentProps, ReactNode } from 'react';

export type CheckboxProps = Omit<ComponentProps<'input'>, 'id' | 'type' | 'className'> & {
  label: ReactNode;
  hint?: string | undefined;
  /** The label is read out but not shown (a column of boxes in a table). */
  labelHidden?: boolean | undefined;
};

export function Checkbox({ label, hint, labelHidden = false, ...rest }: CheckboxProps) {
  const id = useId();
  return (
    <div className="flex items-start gap-2">
      <input
        {...rest}
        id={id}
        type="checkbox"
        aria-describedby={hint === undefined ? undefined : `${id}-hint`}
        className="m-0 mt-0.5 size-4 shrink-0 cursor-pointer accent-(--accent) disabled:cursor-not-allowed"
      />
      <label htmlFor={id} className={labelHidden ? 'sr-only' : 'min-w-0'}>
        {label}
        {hint !== undefined && (
          <span id={`${id}-hint`} className="block text-[13px] text-ink-soft">
            {hint}
          </span>
        )}
      </label>
    </div>
  );
}
