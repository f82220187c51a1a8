import type { ReactNode } from 'react';
import type { FieldValues } from 'react-hook-form';
import { PageHeader } from '../page-header.tsx';
import type { PageHeaderProps } from '../page-header.tsx';
import { Form } from './form.tsx';
import type { FormProps } from './form.tsx';

/** A screen that is one form. */
export function FormPage<Input extends FieldValues, Output>({
  header,
  intro,
  ...form
}: FormProps<Input, Output> & { header: PageHeaderProps; intro?: ReactNode }) {
  return (
    <div className="mx-auto max-w-3xl">
      <PageHeader {...header} />
      {intro !== undefined && <div className="mb-4 max-w-prose text-ink-soft">{intro}</div>}
      <Form {...form} />
    </div>
  );
}
