import type { SpecificationIssue } from '@tipward/contract';
import { Moment } from '../../../../components/ui/moment.tsx';
import { specificationChanges } from '../../lib/specification-changes.ts';
import type { SpecificationChange } from '../../lib/specification-changes.ts';

function Changes({ title, changes }: { title: string; changes: readonly SpecificationChange[] }) {
  return (
    <div className="min-w-0 flex-1 basis-64">
      <h3 className="m-0 text-[13px] font-semibold">{title}</h3>
      <ul className="m-0 list-none p-0">
        {changes.length === 0 && <li>no change of numbers</li>}
        {changes.map((change) => (
          <li key={change.what}>
            {change.what}
            {change.unit !== '' && `, ${change.unit}`}: <span className="figures">{change.before}</span> →{' '}
            <span className="figures">{change.after}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** Two people issued at once: what each of them changed, side by side. */
export function Overtaken({
  from,
  theirs,
  mine,
}: {
  from: SpecificationIssue;
  theirs: SpecificationIssue;
  mine: Pick<SpecificationIssue, 'specification' | 'requirements'>;
}) {
  return (
    <div role="alert" className="border-l-2 border-look bg-look-wash px-3 py-2">
      <p className="m-0 mb-2">
        {theirs.issuedBy.name} made issue {theirs.issue} <Moment at={theirs.issuedAt} />: “{theirs.note}”.
        Nothing of yours is lost. Take over what should stay of theirs, then issue yours after it; or cancel
        to keep theirs.
      </p>
      <div className="flex flex-wrap gap-6">
        <Changes
          title={`Issue ${String(theirs.issue)} changed`}
          changes={specificationChanges(from, theirs)}
        />
        <Changes title="Yours changes" changes={specificationChanges(from, mine)} />
      </div>
    </div>
  );
}
