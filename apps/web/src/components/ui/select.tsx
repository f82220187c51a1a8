import type { ComponentProps } from 'react';
import { Field } from './field.tsx';
import type { FieldProps } from './field.tsx';

export interface SelectOption {
  readonly value: string;
  readonly label: string;
}

export type SelectProps = FieldProps &
  Omit<ComponentProps<'select'>, 'id' | 'className' | 'children'> & { options: readonly SelectOption[] };

export function Select({ label, unit, hint, error, optional, options, ...rest }: SelectProps) {
  return (
    <Field label={label} unit={unit} hint={hint} error={error} optional={optional}>
      {(control) => (
        <select {...rest} {...control} className="control">
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
