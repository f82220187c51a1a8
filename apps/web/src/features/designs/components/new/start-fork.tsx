import type { VersionSummary } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { FormSelect } from '../../../../components/ui/form/form-fields.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { useVersions } from '../../api/list-versions.ts';
import { StartForm } from './start-form.tsx';
import type { StartGiven } from './start-form.tsx';

function optionText({ designName, label, state, keyNumbers, note }: VersionSummary): string {
  const short = note.length > 60 ? `${note.slice(0, 59)}…` : note;
  return `${designName} ${label}, ${state.replaceAll('-', ' ')}, max CP ${formatQuantity('cp', keyNumbers.maxCp)}: ${short}`;
}

/** A design of its own that begins where a version stands. */
export function StartFork(given: StartGiven & { versionId: string | null }) {
  const versions = useVersions(given.programme.id);
  return (
    <Loaded query={versions} what="the versions">
      {({ items }) => {
        const first = items.find(({ id }) => id === given.versionId) ?? items[0];
        return first === undefined ? (
          <EmptyState title="There is no version to begin from yet." />
        ) : (
          <StartForm {...given} start={{ kind: 'fork', versionId: first.id }}>
            <FormSelect
              name="start.versionId"
              label="Version"
              options={items.map((version) => ({ value: version.id, label: optionText(version) }))}
              hint="To go on with the same design, open a draft from its version instead."
            />
          </StartForm>
        );
      }}
    </Loaded>
  );
}
