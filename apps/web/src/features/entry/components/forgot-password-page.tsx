import { requestPasswordReset } from '@tipward/contract';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { callApi } from '../../../lib/api/call-api.ts';
import { useSession } from '../../../lib/session/session-query.ts';
import { EntryPage } from './entry-page.tsx';

function Sent({ email, caught }: { email: string; caught: boolean }) {
  return (
    <EntryPage title="Look into your mail">
      <p role="status" className="m-0">
        If <strong className="font-medium wrap-anywhere">{email}</strong> belongs to an account, a link to set
        a new password is on its way. It works for one hour.
      </p>
      {caught && (
        <p className="m-0">
          Mail is caught on this machine:{' '}
          <Link to="/dev/mail" className="link">
            see it there
          </Link>
          .
        </p>
      )}
      <p className="m-0">
        <Link to="/sign-in" className="link">
          Back to sign in
        </Link>
      </p>
    </EntryPage>
  );
}

export function ForgotPasswordPage() {
  const session = useSession();
  const [sentTo, setSentTo] = useState<string | null>(null);
  if (sentTo !== null) return <Sent email={sentTo} caught={session.data?.mailCatcher === true} />;
  return (
    <EntryPage title="Forgot the password" intro="We send a link with which you set a new one.">
      <Form
        schema={requestPasswordReset.body}
        defaultValues={{ email: '' }}
        submitLabel="Send the link"
        onSubmit={async (body) => {
          await callApi(requestPasswordReset, { body });
          setSentTo(body.email);
        }}
        actions={
          <Link to="/sign-in" className="link mr-auto">
            Back to sign in
          </Link>
        }
      >
        <FormText name="email" label="E-mail" type="email" autoComplete="username" autoFocus />
      </Form>
    </EntryPage>
  );
}
