import { invitePerson, listPeople, ROLES } from '@tipward/contract';
import type { Role } from '@tipward/contract';
import { useState } from 'react';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormCheckbox, FormText } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { Select } from '../../../components/ui/select.tsx';
import { useApiMutation } from '../../../lib/api/api-query.ts';
import { useProgrammes } from '../api/list-programmes.ts';
import { ROLE_OPTIONS } from '../lib/role-names.ts';

export function InviteDialog({ onClose }: { onClose: () => void }) {
  const programmes = useProgrammes();
  const invite = useApiMutation(invitePerson, [listPeople]);
  const [roles, setRoles] = useState<ReadonlyMap<string, Role>>(new Map());
  const choose = (programmeId: string, value: string) => {
    const next = new Map(roles);
    const role = ROLES.find((one) => one === value);
    if (role === undefined) next.delete(programmeId);
    else next.set(programmeId, role);
    setRoles(next);
  };
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Invite a person"
      description="A link to set name and password goes out by e-mail. It works for seven days."
    >
      <Form
        schema={invitePerson.body}
        defaultValues={{ email: '', name: '', isAdministrator: false, memberships: [] }}
        submitLabel="Send the invitation"
        onSubmit={async (body) => {
          const memberships = [...roles].map(([programmeId, role]) => ({ programmeId, role }));
          const person = await invite.mutateAsync({ body: { ...body, memberships } });
          notify.done(`An invitation is on its way to ${person.email}.`);
          onClose();
        }}
      >
        <FormText name="email" label="E-mail" type="email" autoComplete="off" />
        <FormText name="name" label="Name" autoComplete="off" />
        {(programmes.data?.items ?? []).map((programme) => (
          <Select
            key={programme.id}
            label={`Role in ${programme.name}`}
            options={ROLE_OPTIONS}
            value={roles.get(programme.id) ?? ''}
            onChange={(event) => {
              choose(programme.id, event.target.value);
            }}
          />
        ))}
        <FormCheckbox
          name="isAdministrator"
          label="Administrator"
          hint="Manages people, reads the audit, sees every programme."
        />
      </Form>
    </Dialog>
  );
}
