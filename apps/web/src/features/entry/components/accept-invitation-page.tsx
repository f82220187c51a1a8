import { acceptInvitation } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { useAcceptInvitation } from '../api/accept-invitation.ts';
import { useLinkToken } from '../lib/use-link-token.ts';
import { BadLink } from './bad-link.tsx';
import { EntryPage } from './entry-page.tsx';

export function AcceptInvitationPage() {
  const token = useLinkToken();
  const accept = useAcceptInvitation();
  const navigate = useNavigate();
  if (token === null)
    return (
      <BadLink what="Open the whole link of the invitation, or ask an administrator to send it again." />
    );
  return (
    <EntryPage title="Take up the invitation" intro="Choose the name others see, and a password.">
      <Form
        schema={acceptInvitation.body}
        defaultValues={{ token, name: '', password: '' }}
        submitLabel="Set and sign in"
        onSubmit={async (body) => {
          await accept(body);
          await navigate('/', { replace: true });
        }}
      >
        <FormText name="name" label="Name" autoComplete="name" autoFocus />
        <FormText
          name="password"
          label="Password"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters."
        />
      </Form>
    </EntryPage>
  );
}
