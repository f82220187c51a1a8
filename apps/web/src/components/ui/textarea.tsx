import type { ComponentProps } from 'react';
import { Field } from './field.tsx';
import type { FieldProps } from './field.tsx';
import { classNames } from './class-names.ts';

export type TextareaProps = FieldProps &
  Omit<ComponentProps<'textarea'>, 'id' | 'className'> & { figures?: boolean | undefined };

export function Textarea({ label, unit, hint, error, optional, figures = false, ...rest }: TextareaProps) {
  return (
    <Field label={label} unit={unit} hint={hint} error={error} optional={optional}>
      {(control) => (
        <textarea rows={3} {...rest} {...control} className={classNames('control', figures && 'figures')} />
      )}
    </Field>
  );
}
