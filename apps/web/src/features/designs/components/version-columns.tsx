import type { VersionSummary } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { StateBadge } from '../../../components/ui/state-badge.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { VerdictCounts } from '../../../components/ui/verdict-counts.tsx';

interface Choice {
  readonly chosen: readonly string[];
  readonly most: number;
  readonly onToggle: (versionId: string) => void;
  /** Null where no draft may be opened. */
  readonly onOpenDraft: ((versionId: string) => void) | null;
  readonly opening: string | null;
}

function number(
  key: 'maxCp' | 'energyNetMWh' | 'maxRootFlapMomentKNm',
  header: string,
  unit: string,
  kind: QuantityKind,
): Column<VersionSummary> {
  const value = ({ keyNumbers }: VersionSummary) => keyNumbers[key];
  return {
    id: key,
    header,
    unit,
    numeric: true,
    wideOnly: true,
    cell: (version) => formatQuantity(kind, value(version)),
    sort: value,
    text: value,
  };
}

const ABOUT: Column<VersionSummary>[] = [
  {
    id: 'number',
    header: 'Version',
    cell: ({ id, label }) => (
      <Link to={`/versions/${id}`} className="link font-medium">
        {label}
      </Link>
    ),
    sort: (version) => version.number,
    text: ({ label }) => label,
  },
  {
    id: 'state',
    header: 'State',
    cell: ({ state, release }) => <StateBadge state={state} letter={release?.letter} />,
    sort: ({ state }) => state,
    text: ({ state, release }) => `${state}${release === null ? '' : ` ${release.letter}`}`,
  },
  {
    id: 'note',
    header: 'Note',
    fill: true,
    cell: ({ note }) => <span title={note}>{note}</span>,
    text: ({ note }) => note,
  },
  {
    id: 'parent',
    header: 'From',
    wideOnly: true,
    cell: ({ parentLabel }) => parentLabel ?? <span title="first of its line">–</span>,
    text: ({ parentLabel }) => parentLabel,
  },
];

const MADE: Column<VersionSummary>[] = [
  {
    id: 'verdicts',
    header: 'Requirements',
    cell: ({ verdicts }) => <VerdictCounts verdicts={verdicts} />,
    sort: ({ verdicts }) => verdicts.filter(({ verdict }) => verdict !== 'holds').length,
  },
  {
    id: 'author',
    header: 'By',
    wideOnly: true,
    cell: ({ author }) => <span className="whitespace-nowrap">{author.name}</span>,
    sort: ({ author }) => author.name,
    text: ({ author }) => author.name,
  },
  {
    id: 'saved',
    header: 'Saved',
    wideOnly: true,
    cell: ({ savedAt }) => <Moment at={savedAt} />,
    sort: ({ savedAt }) => savedAt,
    text: ({ savedAt }) => savedAt,
  },
];

function chooser({ chosen, most, onToggle }: Choice): Column<VersionSummary> {
  return {
    id: 'choose',
    header: 'Compare',
    cell: ({ id, label }) => (
      <Checkbox
        label={`Compare ${label}`}
        labelHidden
        checked={chosen.includes(id)}
        disabled={!chosen.includes(id) && chosen.length >= most}
        onChange={() => {
          onToggle(id);
        }}
      />
    ),
  };
}

function opener({ onOpenDraft, opening }: Choice): Column<VersionSummary>[] {
  if (onOpenDraft === null) return [];
  const cell = ({ id, label }: VersionSummary) => (
    <Button
      small
      kind="quiet"
      busy={opening === id}
      aria-label={`Open a draft from ${label}`}
      onClick={() => {
        onOpenDraft(id);
      }}
    >
      Open
    </Button>
  );
  return [{ id: 'open', header: 'Draft', cell }];
}

export function versionColumns(choice: Choice): Column<VersionSummary>[] {
  return [
    chooser(choice),
    ...ABOUT,
    number('maxCp', 'Max CP', '', 'cp'),
    number('energyNetMWh', 'Energy, net', 'MWh', 'energyMWh'),
    number('maxRootFlapMomentKNm', 'Root flap', 'kN·m', 'momentKNm'),
    ...MADE,
    ...opener(choice),
  ];
}
