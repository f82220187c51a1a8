import type { ComponentProps } from 'react';
import { Field } from './field.tsx';
import type { FieldProps } from './field.tsx';

export type NumberInputProps = FieldProps & Omit<ComponentProps<'input'>, 'id' | 'className' | 'type'>;

/**
 * A number as text with tabular figures, its unit beside the label. Not type="number": that one hides what was typed
 * when it cannot read it, and the wheel changes it unasked.
 */
export function NumberInput({ label, unit, hint, error, optional, ...rest }: NumberInputProps) {
  return (
    <Field label={label} unit={unit} hint={hint} error={error} optional={optional}>
      {(control) => (
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          {...rest}
          {...control}
          className="control figures"
        />
      )}
    </Field>
  );
}
