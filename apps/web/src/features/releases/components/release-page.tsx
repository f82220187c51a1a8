import type { Release } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { HashLine } from '../../../components/record/hash-line.tsx';
import { KeyNumberTable } from '../../../components/record/key-number-table.tsx';
import { CoefficientPlot, WindPlots } from '../../../components/record/rotor-plots.tsx';
import { SpanPlots } from '../../../components/record/span-plots.tsx';
import { StationList } from '../../../components/record/station-list.tsx';
import { useUrlCursors } from '../../../components/record/use-url-cursors.ts';
import { VerdictList } from '../../../components/record/verdict-list.tsx';
import { Button } from '../../../components/ui/button.tsx';
import { Caution } from '../../../components/ui/caution.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { StateBadge } from '../../../components/ui/state-badge.tsx';
import { useDownloadPackage } from '../api/download-package.ts';
import { useRelease } from '../api/get-release.ts';

function Download({ release }: { release: Release }) {
  const download = useDownloadPackage();
  return (
    <Button
      kind="primary"
      busy={download.isPending}
      onClick={() => {
        download.mutate(release.id, {
          onError: (error) => {
            notify.failed('The package could not be fetched', error);
          },
        });
      }}
    >
      Download package (ZIP, {(release.packageBytes / 1024).toFixed(0)} kB)
    </Button>
  );
}

function Superseded({ release }: { release: Release }) {
  if (release.supersededBy === null) return null;
  return (
    <p role="status" className="mt-0 border-l-4 border-fails bg-fails-wash p-3 text-base">
      <strong>Superseded.</strong> Release {release.supersededBy.letter} is in force:{' '}
      <Link className="link" to={`/releases/${release.supersededBy.id}`}>
        go to release {release.supersededBy.letter}
      </Link>
      .
    </p>
  );
}

function Proof({ release }: { release: Release }) {
  return (
    <Section title="Can I prove what I hold?">
      <dl className="m-0 mb-3 grid gap-2">
        <HashLine label="Package, SHA-256" hash={release.packageSha256} />
        <HashLine label="Design content, SHA-256" hash={release.contentHash} />
      </dl>
      <p className="m-0 mb-2 text-[13px]">
        <code className="figures">sha256sum FILE.zip</code> must print the first line;{' '}
        <code className="figures">npm run verify-release FILE.zip</code> holds every file against the manifest
        inside.
      </p>
      <div className="overflow-x-auto" role="region" aria-label="Files of the package" tabIndex={0}>
        <table className="w-full border-collapse text-[13px] [&_td]:pl-4">
          <thead className="text-ink-soft">
            <tr>
              <th scope="col" className="text-left font-normal">
                File
              </th>
              <th scope="col" className="pl-4 text-right font-normal">
                Bytes
              </th>
              <th scope="col" className="pl-4 text-left font-normal">
                SHA-256
              </th>
            </tr>
          </thead>
          <tbody>
            {release.manifest.map((entry) => (
              <tr key={entry.file} className="h-7 border-t border-rule">
                <th scope="row" className="text-left font-normal">
                  {entry.file}
                </th>
                <td className="figures text-right">{entry.bytes}</td>
                <td className="figures text-xs wrap-anywhere">{entry.sha256}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Section>
  );
}

function Body({ release }: { release: Release }) {
  const cursors = useUrlCursors();
  const items = [
    {
      id: release.id,
      label: release.letter,
      content: release.content,
      evaluation: release.evaluation,
      colorIndex: 0,
    },
  ];
  return (
    <>
      <Superseded release={release} />
      <Caution />
      <div className="mt-6 grid gap-x-8 lg:grid-cols-2">
        <Section title="Key numbers">
          <KeyNumberTable
            items={[
              {
                id: release.id,
                label: `release ${release.letter}`,
                keyNumbers: release.evaluation.keyNumbers,
              },
            ]}
            baseId={null}
          />
        </Section>
        <Section title="Requirements">
          <VerdictList verdicts={release.evaluation.verdicts} />
        </Section>
      </div>
      <Proof release={release} />
      <div className="grid gap-x-8 lg:grid-cols-2">
        <Section title="Along the span" note={`at λ ${release.evaluation.span.tipSpeedRatio.toFixed(2)}`}>
          <SpanPlots
            items={items}
            baseId={null}
            cursorRadiusM={cursors.radiusM}
            onCursor={cursors.setRadius}
          />
        </Section>
        <Section title="Rotor" note={`at pitch ${release.evaluation.curve.pitchDeg.toFixed(2)}°`}>
          <CoefficientPlot
            items={items}
            baseId={null}
            tipSpeedRatio={cursors.tipSpeedRatio}
            onTipSpeedRatio={cursors.setTipSpeedRatio}
          />
          <h3 className="mt-6 mb-2 text-sm font-semibold">Operating schedule</h3>
          <WindPlots items={items} baseId={null} />
        </Section>
      </div>
      <Section title="Stations">
        <StationList content={release.content} />
      </Section>
    </>
  );
}

/** What exactly was released, and can I prove it? */
export function ReleasePage({ releaseId }: { releaseId: string }) {
  const query = useRelease(releaseId);
  return (
    <Loaded query={query} what="the release">
      {(release) => (
        <>
          <PageHeader
            title={`${release.programmeName} release ${release.letter}`}
            trail={[{ label: release.programmeName, to: `/programmes/${release.programmeId}` }]}
            state={<StateBadge state={release.state} letter={release.letter} />}
            meta={
              <>
                <span className="block text-ink wrap-anywhere">
                  {release.designName} {release.versionLabel} · effective: {release.effectivity}
                </span>
                {release.note !== '' && <span className="block wrap-anywhere">{release.note}</span>}
                Approved by {release.approvedBy.name}, <Moment at={release.approvedAt} exact />. Released by{' '}
                {release.releasedBy.name}, <Moment at={release.releasedAt} exact />.
              </>
            }
            actions={<Download release={release} />}
          />
          <Body release={release} />
        </>
      )}
    </Loaded>
  );
}
