import { AdministratorsOnly } from '../components/ui/administrators-only.tsx';
import { AuditPage } from '../features/audit/components/audit-page.tsx';

export function Component() {
  return (
    <AdministratorsOnly>
      <AuditPage />
    </AdministratorsOnly>
  );
}
