import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { useSession } from '../../../lib/session/session-query.ts';
import { ChangePassword } from './change-password.tsx';
import { Roles } from './roles.tsx';
import { SignOutEverywhere } from './sign-out-everywhere.tsx';
import { ThemeChoices } from './theme-choices.tsx';

export function AccountPage() {
  const person = useSession().data?.person;
  // The frame lets nobody in without a session.
  if (person === undefined || person === null) return null;
  return (
    <div className="mx-auto max-w-3xl">
      <PageHeader title="Account" meta={`${person.name}, ${person.email}`} />
      <Section title="Theme">
        <ThemeChoices />
      </Section>
      <Section title="Roles">
        <Roles person={person} />
      </Section>
      <Section title="Password">
        <ChangePassword />
      </Section>
      <Section title="Sessions">
        <SignOutEverywhere />
      </Section>
    </div>
  );
}
