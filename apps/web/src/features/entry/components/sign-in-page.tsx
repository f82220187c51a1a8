import { signIn } from '@tipward/contract';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { useSession } from '../../../lib/session/session-query.ts';
import { useSignIn } from '../api/sign-in.ts';
import { safeNext } from '../lib/safe-next.ts';
import { EntryPage } from './entry-page.tsx';

export function SignInPage() {
  const [search] = useSearchParams();
  const session = useSession();
  const enter = useSignIn();
  const next = search.get('next');
  if (session.data !== undefined && session.data.person !== null)
    return <Navigate to={safeNext(next)} replace />;
  return (
    <EntryPage
      title="Sign in"
      intro={
        next === null
          ? 'Rotor blade design on blade-element momentum theory.'
          : 'Sign in to go on where the link leads.'
      }
    >
      <Form
        schema={signIn.body}
        defaultValues={{ email: '', password: '' }}
        submitLabel="Sign in"
        onSubmit={enter}
        actions={
          <Link to="/forgot-password" className="link mr-auto">
            Forgot the password?
          </Link>
        }
      >
        <FormText name="email" label="E-mail" type="email" autoComplete="username" autoFocus />
        <FormText name="password" label="Password" type="password" autoComplete="current-password" />
      </Form>
      {session.data?.demo === true && (
        <p className="m-0 border-t border-rule pt-3 text-[13px] text-ink-soft">
          This is a demonstration. Its sign-ins are printed where it was started.
        </p>
      )}
    </EntryPage>
  );
}
