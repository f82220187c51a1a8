import { useId } from 'react';
import type { ReactNode } from 'react';

export interface FieldProps {
  label: string;
  /** Shown beside the label, never in the control. */
  unit?: string | undefined;
  hint?: ReactNode;
  error?: string | undefined;
  /** Marks that the field may stay empty. */
  optional?: boolean | undefined;
}

export interface ControlAttributes {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

/** Label with unit, control, hint, and the fault right beside what it concerns. */
export function Field({
  label,
  unit,
  hint,
  error,
  optional = false,
  children,
}: FieldProps & { children: (control: ControlAttributes) => ReactNode }) {
  const id = useId();
  const described = [hint === undefined ? null : `${id}-hint`, error === undefined ? null : `${id}-error`]
    .filter((part) => part !== null)
    .join(' ');
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="font-medium">
        {label}
        {unit !== undefined && unit !== '' && <span className="font-normal text-ink-soft">, {unit}</span>}
        {optional && <span className="font-normal text-ink-soft"> (optional)</span>}
      </label>
      {children({
        id,
        'aria-describedby': described === '' ? undefined : described,
        'aria-invalid': error === undefined ? undefined : true,
      })}
      {error !== undefined && (
        <p id={`${id}-error`} className="m-0 text-[13px] text-fails">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      )}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="m-0 text-[13px] text-ink-soft">
          {hint}
        </p>
      )}
    </div>
  );
}
