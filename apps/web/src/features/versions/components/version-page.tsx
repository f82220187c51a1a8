import type { Version } from '@tipward/contract';
import { stationsCsv } from '@tipward/design-model';
import { Link } from 'react-router-dom';
import { HashLine } from '../../../components/record/hash-line.tsx';
import { KeyNumberTable } from '../../../components/record/key-number-table.tsx';
import type { RecordedItem } from '../../../components/record/recorded-item.ts';
import { CoefficientPlot, WindPlots } from '../../../components/record/rotor-plots.tsx';
import { SpanPlots } from '../../../components/record/span-plots.tsx';
import { StationList } from '../../../components/record/station-list.tsx';
import { useUrlCursors } from '../../../components/record/use-url-cursors.ts';
import { VerdictList } from '../../../components/record/verdict-list.tsx';
import { Button } from '../../../components/ui/button.tsx';
import { Caution } from '../../../components/ui/caution.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { StateBadge } from '../../../components/ui/state-badge.tsx';
import { VerdictCounts } from '../../../components/ui/verdict-counts.tsx';
import { saveCsv } from '../../../lib/files/save-file.ts';
import { useParent, useVersion } from '../api/get-version.ts';
import { VersionActions } from './version-actions.tsx';

function Head({ version }: { version: Version }) {
  return (
    <PageHeader
      title={`${version.designName} ${version.label}`}
      trail={[
        { label: version.programmeName, to: `/programmes/${version.programmeId}` },
        { label: version.designName, to: `/designs/${version.designId}` },
      ]}
      state={<StateBadge state={version.state} letter={version.release?.letter} />}
      meta={
        <>
          <span className="block text-ink wrap-anywhere">{version.note}</span>
          Saved by {version.author.name}, <Moment at={version.savedAt} />
          {version.parentId !== null && (
            <>
              , from{' '}
              <Link className="link" to={`/versions/${version.parentId}`}>
                {version.parentLabel}
              </Link>
            </>
          )}
          . Specification issue {version.specificationIssue}.
        </>
      }
      actions={<VersionActions version={version} />}
    />
  );
}

function Plots({ items, baseId }: { items: readonly RecordedItem[]; baseId: string | null }) {
  const cursors = useUrlCursors();
  return (
    <>
      <div className="grid gap-8 lg:grid-cols-2">
        <Section
          title="Along the span"
          note={`at λ ${items.at(-1)?.evaluation.span.tipSpeedRatio.toFixed(2) ?? '–'}`}
        >
          <SpanPlots
            items={items}
            baseId={baseId}
            cursorRadiusM={cursors.radiusM}
            onCursor={cursors.setRadius}
          />
        </Section>
        <Section
          title="Rotor"
          note={`at pitch ${items.at(-1)?.evaluation.curve.pitchDeg.toFixed(2) ?? '–'}°`}
        >
          <CoefficientPlot
            items={items}
            baseId={baseId}
            tipSpeedRatio={cursors.tipSpeedRatio}
            onTipSpeedRatio={cursors.setTipSpeedRatio}
          />
          <h3 className="mt-6 mb-2 text-sm font-semibold">Operating schedule</h3>
          <WindPlots items={items} baseId={baseId} />
        </Section>
      </div>
    </>
  );
}

function Body({ version, parent }: { version: Version; parent: Version | null }) {
  const numbered = [...(parent === null ? [] : [parent]), version];
  const items = numbered.map((each, i) => ({
    id: each.id,
    label: each.label,
    content: each.content,
    evaluation: each.evaluation,
    colorIndex: parent === null ? 0 : 1 - i,
  }));
  const baseId = parent?.id ?? null;
  const { warnings } = version.evaluation;
  return (
    <>
      <div className="grid gap-x-8 lg:grid-cols-2">
        <Section title="Does it hold?" note={<VerdictCounts verdicts={version.verdicts} />}>
          <VerdictList verdicts={version.verdicts} />
          {warnings.length > 0 && (
            <ul className="mt-3 mb-0 pl-5 text-[13px] text-look">
              {warnings.map((warning) => (
                <li key={`${warning.code} ${warning.station ?? ''}`}>{warning.message}</li>
              ))}
            </ul>
          )}
        </Section>
        <Section title={parent === null ? 'Key numbers' : `Key numbers against ${parent.label}`}>
          <KeyNumberTable items={numbered} baseId={baseId} />
        </Section>
      </div>
      {version.changeSummary.length > 0 && (
        <Section title={`What changed since ${version.parentLabel ?? 'its parent'}`}>
          <ul className="m-0 pl-5">
            {version.changeSummary.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        </Section>
      )}
      <Plots items={items} baseId={baseId} />
      <Section
        title="Stations"
        actions={
          <Button
            small
            onClick={() => {
              saveCsv(stationsCsv(version.content), `${version.designName} ${version.label} stations.csv`);
            }}
          >
            CSV
          </Button>
        }
      >
        <StationList content={version.content} base={parent?.content} />
      </Section>
      <Section title="Proof">
        <dl className="m-0 grid gap-2">
          <HashLine label="Content, SHA-256" hash={version.contentHash} />
          <HashLine
            label="Specification and requirements, SHA-256"
            hash={version.evaluation.specificationHash}
          />
          <HashLine
            label="Solver"
            hash={`${version.evaluation.solver.name} ${version.evaluation.solver.version}`}
          />
        </dl>
      </Section>
      <Caution />
    </>
  );
}

/** What is it, who made it from what, does it hold? */
export function VersionPage({ versionId }: { versionId: string }) {
  const version = useVersion(versionId);
  const parent = useParent(version.data?.parentId ?? null);
  return (
    <Loaded query={version} what="the version">
      {(data) => (
        <>
          <Head version={data} />
          <Body version={data} parent={parent.data ?? null} />
        </>
      )}
    </Loaded>
  );
}
