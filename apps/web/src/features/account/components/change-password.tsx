import { changePassword } from '@tipward/contract';
import { useState } from 'react';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { callApi } from '../../../lib/api/call-api.ts';

export function ChangePassword() {
  const [round, setRound] = useState(0);
  return (
    <div className="max-w-sm">
      <Form
        key={round}
        schema={changePassword.body}
        defaultValues={{ currentPassword: '', newPassword: '' }}
        submitLabel="Change the password"
        onSubmit={async (body) => {
          await callApi(changePassword, { body });
          notify.done('The password is changed. All other sessions have ended.');
          setRound(round + 1);
        }}
      >
        <FormText
          name="currentPassword"
          label="Current password"
          type="password"
          autoComplete="current-password"
        />
        <FormText
          name="newPassword"
          label="New password"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters. All other sessions of yours end."
        />
      </Form>
    </div>
  );
}
