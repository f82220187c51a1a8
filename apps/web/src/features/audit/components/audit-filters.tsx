import { FieldGrid } from '../../../components/ui/form/field-grid.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { useFilterChoices } from '../api/filter-choices.ts';
import type { AuditFilter } from '../api/list-audit-events.ts';
import { ACTIONS } from '../lib/actions.ts';

const all = (label: string) => ({ value: '', label });

export function AuditFilters({
  filter,
  onChange,
}: {
  filter: AuditFilter;
  onChange: (name: keyof AuditFilter, value: string) => void;
}) {
  const { people, programmes } = useFilterChoices();
  return (
    <FieldGrid>
      <Select
        label="What"
        value={filter.action}
        options={[all('everything'), ...ACTIONS.map((value) => ({ value, label: value }))]}
        onChange={(event) => {
          onChange('action', event.target.value);
        }}
      />
      <Select
        label="Who"
        value={filter.actorId}
        options={[all('everybody'), ...people.map(({ id, name }) => ({ value: id, label: name }))]}
        onChange={(event) => {
          onChange('actorId', event.target.value);
        }}
      />
      <Select
        label="Programme"
        value={filter.programmeId}
        options={[all('all'), ...programmes.map(({ id, name }) => ({ value: id, label: name }))]}
        onChange={(event) => {
          onChange('programmeId', event.target.value);
        }}
      />
    </FieldGrid>
  );
}
