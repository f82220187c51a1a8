import { quantity } from '@tipward/contract';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiProblem } from '../../../lib/api/api-problem.ts';
import { Form } from './form.tsx';
import { FormNumber, FormText } from './form-fields.tsx';

afterEach(cleanup);

const radius = quantity({ label: 'Radius', unit: 'm', min: 0, max: 20, above: true });
const schema = z.strictObject({
  name: z.string().min(1, 'Name is empty; allowed: text'),
  blade: z.strictObject({ radiusM: radius, capM: radius.nullable() }),
});

function show(onSubmit: (values: z.output<typeof schema>) => Promise<unknown>) {
  render(
    <Form
      schema={schema}
      defaultValues={{ name: '', blade: { capM: null } }}
      submitLabel="Save"
      onSubmit={onSubmit}
    >
      <FormText name="name" label="Name" />
      <FormNumber name="blade.radiusM" label="Radius" unit="m" />
      <FormNumber name="blade.capM" label="Cap" unit="m" optional />
    </Form>,
  );
  return userEvent.setup();
}
const field = (name: RegExp) => screen.getByRole('textbox', { name });

describe('Form', () => {
  it('shows every fault beside its cause, in the words of the contract, and sends nothing', async () => {
    const submit = vi.fn(() => Promise.resolve());
    const user = show(submit);
    await user.type(field(/Radius/u), '1,5');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText(/Name is empty/u)).toBeTruthy();
    expect(
      screen.getByText(/Radius is not a finite number; allowed: a number above 0 and at most 20 m/u),
    ).toBeTruthy();
    expect(field(/Radius/u).getAttribute('aria-invalid')).toBe('true');
    expect(field(/Cap/u).getAttribute('aria-invalid')).toBeNull();
    expect(submit).not.toHaveBeenCalled();
  });

  it('sends numbers as numbers and an empty optional one as null', async () => {
    const submit = vi.fn(() => Promise.resolve());
    const user = show(submit);
    await user.type(field(/Name/u), 'Blade');
    await user.type(field(/Radius/u), ' 7.8 ');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await vi.waitFor(() => {
      expect(submit).toHaveBeenCalledWith({ name: 'Blade', blade: { radiusM: 7.8, capM: null } });
    });
  });

  it('puts the server’s faults on their fields and shows the rest as a whole', async () => {
    const faults = [{ field: 'blade.radiusM', value: '7.8', message: 'Radius is beyond the rotor' }];
    const refusal = (more: typeof faults) =>
      new ApiProblem({
        type: 'x',
        title: 'Refused',
        status: 422,
        code: 'invalid',
        faults: [...faults, ...more],
      });
    const submit = vi
      .fn<() => Promise<unknown>>()
      .mockRejectedValueOnce(refusal([]))
      .mockRejectedValueOnce(refusal([{ field: 'owner', value: '"x"', message: 'is unknown' }]));
    const user = show(submit);
    await user.type(field(/Name/u), 'Blade');
    await user.type(field(/Radius/u), '7.8');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText('Radius is beyond the rotor')).toBeTruthy();
    expect(screen.queryByRole('alert')).toBeNull();
    expect(document.activeElement).toBe(field(/Radius/u));
    await user.type(field(/Radius/u), '1');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect((await screen.findByRole('alert')).textContent).toContain('owner = "x" is unknown');
  });
});
