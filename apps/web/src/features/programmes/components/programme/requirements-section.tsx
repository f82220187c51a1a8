import { REQUIREMENT_KINDS } from '@tipward/contract';
import type { Programme, Requirement, Verdict } from '@tipward/contract';
import { Section } from '../../../../components/ui/section.tsx';
import { VerdictMark } from '../../../../components/ui/verdict-mark.tsx';
import { useRelease } from '../../api/get-release.ts';
import { useDesigns } from '../../api/list-designs.ts';
import { limitText, requirementValue, verdictOn } from '../../lib/requirement-text.ts';

interface Result {
  readonly key: string;
  readonly title: string;
  readonly specificationIssue: number;
  readonly verdicts: readonly Verdict[];
}

/** The released version and the latest of each design, as far as this person may see them. */
function useResults(programme: Programme): Result[] {
  const release = useRelease(programme.currentRelease?.id ?? null).data;
  const designs = useDesigns(programme.id, programme.abilities.seeWork).data?.items ?? [];
  const released: Result[] =
    release === undefined
      ? []
      : [
          {
            key: release.id,
            title: `Release ${release.letter}`,
            specificationIssue: release.content.specificationIssue,
            verdicts: release.evaluation.verdicts,
          },
        ];
  const latest = designs.flatMap(({ name, latestVersion }): Result[] =>
    latestVersion === null || latestVersion.id === release?.versionId
      ? []
      : [{ ...latestVersion, key: latestVersion.id, title: `${name} ${latestVersion.label}` }],
  );
  return [...released, ...latest.slice(0, 4)];
}

function ResultCell({ requirement, result }: { requirement: Requirement; result: Result }) {
  const found = verdictOn(requirement.kind, requirement.limit, result.verdicts);
  if (found === null)
    return <span title={`not held against issue ${String(result.specificationIssue)}`}>–</span>;
  const { verdict, otherLimit } = found;
  return (
    <span className="inline-flex gap-3" title={verdict.reason}>
      <span className="figures min-w-16 text-right">{requirementValue(requirement.kind, verdict.value)}</span>
      {otherLimit ? (
        <span className="text-look">other limit in issue {result.specificationIssue}</span>
      ) : (
        <VerdictMark verdict={verdict.verdict} />
      )}
    </span>
  );
}

/** Does it meet the specification? Requirements down, results across. */
export function RequirementsSection({ programme }: { programme: Programme }) {
  const results = useResults(programme);
  const { requirements } = programme.specification;
  return (
    <Section title="Requirements" note={`Specification issue ${String(programme.latestIssue)}`}>
      {requirements.length === 0 ? (
        <p className="m-0 py-1 text-ink-soft">The specification sets no requirement.</p>
      ) : (
        <div role="region" aria-label="Requirements and results" tabIndex={0} className="overflow-x-auto">
          <table className="w-full max-w-5xl border-collapse text-left">
            <thead>
              <tr className="h-8 bg-panel">
                <th scope="col" className="px-2 font-medium">
                  Requirement
                </th>
                <th scope="col" className="px-2 text-right font-medium">
                  Limit
                </th>
                {results.map((result) => (
                  <th key={result.key} scope="col" className="px-2 font-medium">
                    {result.title}
                    {result.specificationIssue !== programme.latestIssue && (
                      <span className="block text-xs font-normal text-look">
                        issue {result.specificationIssue}
                      </span>
                    )}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {requirements.map((requirement) => {
                const { label, unit } = REQUIREMENT_KINDS[requirement.kind];
                return (
                  <tr key={requirement.kind} className="h-7 border-b border-rule">
                    <th scope="row" className="min-w-36 px-2 font-normal" title={requirement.reason}>
                      {label}
                      {unit !== '' && <span className="text-ink-soft">, {unit}</span>}
                    </th>
                    <td className="figures px-2 text-right whitespace-nowrap">{limitText(requirement)}</td>
                    {results.map((result) => (
                      <td key={result.key} className="px-2 whitespace-nowrap">
                        <ResultCell requirement={requirement} result={result} />
                      </td>
                    ))}
                  </tr>
                );
              })}
            </tbody>
          </table>
        </div>
      )}
    </Section>
  );
}
