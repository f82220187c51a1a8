import type { ComponentProps } from 'react';
import { Field } from './field.tsx';
import type { FieldProps } from './field.tsx';

export type TextInputProps = FieldProps & Omit<ComponentProps<'input'>, 'id' | 'className'>;

export function TextInput({ label, unit, hint, error, optional, ...rest }: TextInputProps) {
  return (
    <Field label={label} unit={unit} hint={hint} error={error} optional={optional}>
      {(control) => <input type="text" {...rest} {...control} className="control" />}
    </Field>
  );
}
