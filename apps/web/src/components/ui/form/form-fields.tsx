import { Checkbox } from '../checkbox.tsx';
import type { CheckboxProps } from '../checkbox.tsx';
import { NumberInput } from '../number-input.tsx';
import type { NumberInputProps } from '../number-input.tsx';
import { Select } from '../select.tsx';
import type { SelectProps } from '../select.tsx';
import { TextInput } from '../text-input.tsx';
import type { TextInputProps } from '../text-input.tsx';
import { Textarea } from '../textarea.tsx';
import type { TextareaProps } from '../textarea.tsx';
import { readTyped } from './read-typed.ts';
import { useField } from './use-field.ts';

type Named<P> = Omit<P, 'name' | 'error'> & { name: string };

/** The controls of the kit, bound by `name` to the form around them (FormPage or Form). */
export function FormText({ name, ...rest }: Named<TextInputProps>) {
  return <TextInput {...rest} {...useField(name)} />;
}

export function FormTextarea({ name, ...rest }: Named<TextareaProps>) {
  return <Textarea {...rest} {...useField(name)} />;
}

/** `optional`: an empty field is null. */
export function FormNumber({ name, ...rest }: Named<NumberInputProps>) {
  const emptyIsNull = rest.optional === true;
  return <NumberInput {...rest} {...useField(name, (value) => readTyped(value, emptyIsNull))} />;
}

export function FormSelect({ name, ...rest }: Named<SelectProps>) {
  return <Select {...rest} {...useField(name)} />;
}

export function FormCheckbox({ name, ...rest }: Named<CheckboxProps>) {
  const { error: _error, ...field } = useField(name);
  return <Checkbox {...rest} {...field} />;
}
