import { resetPassword } from '@tipward/contract';
import { Link, useNavigate } from 'react-router-dom';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { callApi } from '../../../lib/api/call-api.ts';
import { useLinkToken } from '../lib/use-link-token.ts';
import { BadLink } from './bad-link.tsx';
import { EntryPage } from './entry-page.tsx';

export function ResetPasswordPage() {
  const token = useLinkToken();
  const navigate = useNavigate();
  if (token === null)
    return (
      <BadLink what="Open the whole link of the e-mail, or ask for a new one under ‘Forgot the password?’." />
    );
  return (
    <EntryPage title="Set a new password" intro="Every open session of the account ends.">
      <Form
        schema={resetPassword.body}
        defaultValues={{ token, password: '' }}
        submitLabel="Set the password"
        onSubmit={async (body) => {
          await callApi(resetPassword, { body });
          notify.done('The new password is set. Sign in with it.');
          await navigate('/sign-in');
        }}
        actions={
          <Link to="/forgot-password" className="link mr-auto">
            Ask for a new link
          </Link>
        }
      >
        <FormText
          name="password"
          label="New password"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters."
          autoFocus
        />
      </Form>
    </EntryPage>
  );
}
