import type { Person } from '@tipward/contract';
import { signOut } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { buttonStyle } from '../../components/ui/button-style.ts';
import { Menu, MenuChoice, MenuItem, MenuLabel, MenuRule } from '../../components/ui/menu.tsx';
import { notify } from '../../components/ui/notify.ts';
import { callApi } from '../../lib/api/call-api.ts';
import { sessionQuery, useEnterSession } from '../../lib/session/session-query.ts';
import { THEMES, chooseTheme, useThemeChoice } from '../../lib/theme/theme.ts';
import { useQueryClient } from '@tanstack/react-query';

const THEME_NAMES = { system: 'As the system', light: 'Light', dark: 'Dark' } as const;

function useSignOut() {
  const client = useQueryClient();
  const enter = useEnterSession();
  const navigate = useNavigate();
  return async () => {
    try {
      await callApi(signOut, {});
      const session = client.getQueryData(sessionQuery.queryKey);
      await navigate('/sign-in');
      if (session !== undefined) enter({ ...session, person: null, csrfToken: null });
    } catch (error) {
      notify.failed('You are still signed in.', error);
    }
  };
}

export default function AccountMenu({ person, mailCatcher }: { person: Person; mailCatcher: boolean }) {
  const navigate = useNavigate();
  const theme = useThemeChoice();
  const leave = useSignOut();
  return (
    <Menu
      trigger={
        <button type="button" className={buttonStyle('quiet')}>
          <span className="max-w-40 truncate">{person.name}</span>
          <span aria-hidden="true" className="text-[9px]">
            ▼
          </span>
        </button>
      }
    >
      <MenuLabel>{person.email}</MenuLabel>
      <MenuItem onSelect={() => void navigate('/account')}>Account</MenuItem>
      {mailCatcher && <MenuItem onSelect={() => void navigate('/dev/mail')}>Caught mail</MenuItem>}
      <MenuRule />
      <MenuLabel>Theme</MenuLabel>
      <MenuChoice
        value={theme}
        options={THEMES.map((value) => ({ value, label: THEME_NAMES[value] }))}
        onChoose={chooseTheme}
      />
      <MenuRule />
      <MenuItem onSelect={() => void leave()}>Sign out</MenuItem>
    </Menu>
  );
}
