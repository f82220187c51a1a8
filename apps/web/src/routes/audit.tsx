export { AuditPage as Component } from '../features/audit/components/audit-page.tsx';
