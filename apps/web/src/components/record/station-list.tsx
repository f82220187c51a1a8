import type { DesignContent, Station } from '@tipward/contract';
import { diffContents, formatQuantity } from '@tipward/design-model';
import type { StationDifference } from '@tipward/design-model';

type Cell = 'chordM' | 'twistDeg' | 'thicknessPct';
const CELLS: readonly { cell: Cell; title: string; kind: Cell }[] = [
  { cell: 'chordM', title: 'c, m', kind: 'chordM' },
  { cell: 'twistDeg', title: 'θ, °', kind: 'twistDeg' },
  { cell: 'thicknessPct', title: 't/c, %', kind: 'thicknessPct' },
];

const WORDS = { same: '', changed: 'changed', added: 'added', removed: 'removed' } as const;

function Changed({ children, before }: { children: string; before: string }) {
  return (
    <span className="rounded-xs bg-look-wash px-1" title={`was ${before}`}>
      <span aria-hidden="true">✳ </span>
      {children}
      <span className="sr-only">, changed, was {before}</span>
    </span>
  );
}

function cellText(row: StationDifference, station: Station, cell: Cell) {
  const now = formatQuantity(cell, station[cell]);
  if (row.before === null || !row.changedCells.includes(cell)) return now;
  return <Changed before={formatQuantity(cell, row.before[cell])}>{now}</Changed>;
}

function Row({
  row,
  compared,
  onPick,
}: {
  row: StationDifference;
  compared: boolean;
  onPick?: ((radiusM: number) => void) | undefined;
}) {
  const station = row.after ?? row.before;
  if (station === null) return null;
  const radius = formatQuantity('radiusM', station.radiusM);
  const airfoil = station.airfoil ?? 'blended';
  return (
    <tr
      className={
        row.change === 'removed'
          ? 'h-7 border-t border-rule text-ink-soft line-through'
          : 'h-7 border-t border-rule'
      }
    >
      <th scope="row" className="figures text-right font-semibold">
        {onPick === undefined ? (
          radius
        ) : (
          <button
            type="button"
            className="link figures min-h-6 cursor-pointer border-0 bg-transparent p-0"
            onClick={() => {
              onPick(station.radiusM);
            }}
          >
            {radius}
          </button>
        )}
      </th>
      {CELLS.map(({ cell }) => (
        <td key={cell} className="figures text-right whitespace-nowrap">
          {cellText(row, station, cell)}
        </td>
      ))}
      <td className="wrap-anywhere">
        {row.before !== null && row.changedCells.includes('airfoil') ? (
          <Changed before={row.before.airfoil ?? 'blended'}>{airfoil}</Changed>
        ) : (
          airfoil
        )}
      </td>
      {compared && <td className="text-xs text-ink-soft">{WORDS[row.change]}</td>}
    </tr>
  );
}

/** Stations read only; held against a reference, changed cells carry a mark and their former value. */
export function StationList({
  content,
  base,
  onPick,
}: {
  content: DesignContent;
  base?: DesignContent | undefined;
  onPick?: (radiusM: number) => void;
}) {
  const rows = diffContents(base ?? content, content).stations;
  const compared = base !== undefined;
  return (
    <div className="max-h-[32rem] overflow-auto" role="region" aria-label="Stations" tabIndex={0}>
      <table className="w-full border-collapse text-[13px] [&_td]:pl-3 [&_thead_th]:pl-3">
        <thead className="sticky top-0 bg-paper text-ink-soft">
          <tr>
            <th scope="col" className="text-right font-normal">
              r, m
            </th>
            {CELLS.map(({ cell, title }) => (
              <th key={cell} scope="col" className="text-right font-normal">
                {title}
              </th>
            ))}
            <th scope="col" className="text-left font-normal">
              Airfoil
            </th>
            {compared && (
              <th scope="col" className="text-left font-normal">
                Change
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <Row key={row.radiusM} row={row} compared={compared} onPick={onPick} />
          ))}
        </tbody>
      </table>
    </div>
  );
}
