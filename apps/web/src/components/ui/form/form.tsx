import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import type { ReactNode } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { DefaultValues, FieldValues } from 'react-hook-form';
import type { z } from 'zod';
import { ApiProblem } from '../../../lib/api/api-problem.ts';
import { Button } from '../button.tsx';
import { DialogActions } from '../dialog-actions.tsx';
import { Problem } from '../problem.tsx';
import { placeFaults } from './place-faults.ts';

export interface FormProps<Input extends FieldValues, Output> {
  /** The contract's body schema (or a part of it): the same words on both sides. */
  schema: z.ZodType<Output, Input>;
  defaultValues: DefaultValues<Input>;
  /** Throws ApiProblem when refused: its faults land on their fields, the rest above the buttons. */
  onSubmit: (values: Output) => Promise<unknown>;
  submitLabel: string;
  /** Beside the submit button, before it. */
  actions?: ReactNode;
  children: ReactNode;
}

/** A form held to the contract. Children are FormText, FormNumber, … by name; all faults show at once, beside their cause. */
export function Form<Input extends FieldValues, Output>(props: FormProps<Input, Output>) {
  const { schema, defaultValues, onSubmit, submitLabel, actions, children } = props;
  const form = useForm<Input, unknown, Output>({
    resolver: zodResolver(schema),
    defaultValues,
    criteriaMode: 'firstError',
  });
  const [refusal, setRefusal] = useState<unknown>(null);
  const submit = form.handleSubmit(async (values) => {
    setRefusal(null);
    try {
      await onSubmit(values);
    } catch (error) {
      const rest = error instanceof ApiProblem ? placeFaults(form, error) : error;
      setRefusal(rest);
    }
  });
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
        {children}
        {refusal !== null && <Problem error={refusal} />}
        <DialogActions>
          {actions}
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting}>
            {submitLabel}
          </Button>
        </DialogActions>
      </form>
    </FormProvider>
  );
}
