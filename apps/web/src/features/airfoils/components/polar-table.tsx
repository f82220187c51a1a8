import type { Airfoil, PolarData } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import type { Column } from '../../../components/ui/table/column.ts';
import { DataTable } from '../../../components/ui/table/data-table.tsx';
import { VerdictMark } from '../../../components/ui/verdict-mark.tsx';
import { polarFacts } from '../lib/polar-facts.ts';
import type { PolarFacts } from '../lib/polar-facts.ts';
import { exactReynolds, polarName } from '../lib/polar-series.ts';

interface Row {
  readonly polar: PolarData;
  readonly facts: PolarFacts;
}

function measured({ measuredFromDeg, measuredToDeg }: PolarData): string {
  if (measuredFromDeg === null && measuredToDeg === null) return 'not stated';
  return `${String(measuredFromDeg ?? '…')} to ${String(measuredToDeg ?? '…')}`.replaceAll('-', '−');
}

const COLUMNS: Column<Row>[] = [
  {
    id: 're',
    header: 'Reynolds number',
    numeric: true,
    cell: ({ polar }) => exactReynolds(polar.reynolds),
    sort: ({ polar }) => polar.reynolds,
    text: ({ polar }) => polar.reynolds,
  },
  {
    id: 'surface',
    header: 'Surface',
    cell: ({ polar }) => polar.surfaceState,
    sort: ({ polar }) => polar.surfaceState,
    text: ({ polar }) => polar.surfaceState,
  },
  {
    id: 'maxCl',
    header: 'Max cl',
    numeric: true,
    cell: ({ facts }) => formatQuantity('coefficient', facts.maxCl),
    sort: ({ facts }) => facts.maxCl,
    text: ({ facts }) => facts.maxCl,
  },
  {
    id: 'alpha',
    header: 'at α',
    unit: '°',
    numeric: true,
    cell: ({ facts }) => formatQuantity('angleDeg', facts.alphaAtMaxClDeg),
    text: ({ facts }) => facts.alphaAtMaxClDeg,
  },
  {
    id: 'minCd',
    header: 'Min cd',
    numeric: true,
    wideOnly: true,
    cell: ({ facts }) => formatQuantity('cp', facts.minCd),
    sort: ({ facts }) => facts.minCd,
    text: ({ facts }) => facts.minCd,
  },
  {
    id: 'glide',
    header: 'Max cl/cd',
    numeric: true,
    wideOnly: true,
    cell: ({ facts }) => formatQuantity('forceNM', facts.maxGlideRatio),
    sort: ({ facts }) => facts.maxGlideRatio,
    text: ({ facts }) => facts.maxGlideRatio,
  },
  {
    id: 'slope',
    header: 'Lift slope',
    unit: '% of 2π',
    numeric: true,
    wideOnly: true,
    cell: ({ facts }) => (facts.liftSlopeShare === null ? '–' : (facts.liftSlopeShare * 100).toFixed(0)),
    text: ({ facts }) => facts.liftSlopeShare,
  },
  {
    id: 'measured',
    header: 'Measured range',
    unit: '°',
    wideOnly: true,
    cell: ({ polar }) => measured(polar),
    text: ({ polar }) => measured(polar),
  },
  {
    id: 'concerns',
    header: 'To look at',
    cell: ({ facts }) =>
      facts.concerns.length === 0 ? (
        <VerdictMark verdict="holds" word="nothing found" />
      ) : (
        <span className="text-look">▲ {facts.concerns.join(' ')}</span>
      ),
    text: ({ facts }) => facts.concerns.join(' '),
  },
  {
    id: 'source',
    header: 'Source',
    wideOnly: true,
    fill: true,
    cell: ({ polar }) => <span title={polar.source}>{polar.source}</span>,
    text: ({ polar }) => polar.source,
  },
];

export function PolarTable({ airfoil }: { airfoil: Airfoil }) {
  return (
    <DataTable
      label={`Polars of ${airfoil.name}`}
      rows={airfoil.polars.map((polar) => ({ polar, facts: polarFacts(polar, airfoil.thicknessPct) }))}
      columns={COLUMNS}
      rowKey={({ polar }) => polarName(polar)}
      toolsFrom={0}
      empty={null}
    />
  );
}
