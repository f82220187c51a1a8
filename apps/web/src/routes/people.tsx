import { AdministratorsOnly } from '../components/ui/administrators-only.tsx';
import { PeoplePage } from '../features/people/components/people-page.tsx';

export function Component() {
  return (
    <AdministratorsOnly>
      <PeoplePage />
    </AdministratorsOnly>
  );
}
