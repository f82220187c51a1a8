import { useFormContext } from 'react-hook-form';
import type { FieldError } from 'react-hook-form';

/** The control's registration and the fault that concerns it. */
export function useField(name: string, setValueAs?: (value: unknown) => unknown) {
  const { register, formState, getFieldState } = useFormContext();
  const fault: (FieldError & { root?: FieldError }) | undefined = getFieldState(name, formState).error;
  return {
    ...register(name, setValueAs === undefined ? {} : { setValueAs }),
    error: fault?.message ?? fault?.root?.message,
  };
}
