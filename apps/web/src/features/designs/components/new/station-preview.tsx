import { STATION_RULES } from '@tipward/contract';
import type { DraftStation } from '@tipward/contract';
import type { CellFault, StationBlock } from '@tipward/design-model';
import { classNames } from '../../../../components/ui/class-names.ts';
import { unknownAirfoils } from '../../lib/unknown-airfoils.ts';

const NUMBERS = ['radiusM', 'chordM', 'twistDeg', 'thicknessPct'] as const;

function Row({ row, index, faults }: { row: DraftStation; index: number; faults: readonly CellFault[] }) {
  const faultOf = (field: string) => faults.find((fault) => fault.row === index && fault.field === field);
  return (
    <tr className="h-7 border-b border-rule">
      <th scope="row" className="px-2 text-left font-normal text-ink-soft">
        {index + 1}
      </th>
      {NUMBERS.map((field) => {
        const fault = faultOf(field);
        return (
          <td
            key={field}
            title={fault?.message}
            className={classNames(
              'figures px-2 text-right',
              fault !== undefined && 'bg-fails-wash text-fails outline outline-fails',
            )}
          >
            {row[field] === '' ? <span className="text-ink-soft">empty</span> : row[field]}
            {fault !== undefined && <span aria-hidden="true"> ▲</span>}
          </td>
        );
      })}
      <td className="px-2">{row.airfoil ?? <span className="text-ink-soft">blended</span>}</td>
    </tr>
  );
}

function Faults({ faults, unknown }: { faults: readonly CellFault[]; unknown: readonly string[] }) {
  if (faults.length === 0 && unknown.length === 0) return null;
  return (
    <div role="alert" className="border-l-2 border-look bg-look-wash px-3 py-2">
      <p className="m-0 font-medium">Kept as they are, to be put right in the draft:</p>
      <ul className="m-0 list-none p-0">
        {faults.map((fault) => (
          <li key={`${String(fault.row)} ${fault.field}`}>
            Station {fault.row + 1}: <span className="figures">{fault.value}</span> {fault.message}
          </li>
        ))}
        {unknown.map((name) => (
          <li key={name}>
            Airfoil <span className="figures">{name}</span> is not in the library
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The block as it was understood, faulty cells marked; nothing is dropped. */
export function StationPreview({
  block,
  airfoilNames,
}: {
  block: StationBlock;
  airfoilNames: readonly string[];
}) {
  return (
    <div className="flex flex-col gap-3">
      <p role="status" className="m-0">
        {block.rows.length} {block.rows.length === 1 ? 'station' : 'stations'} read
        {block.header === null ? ', columns in the usual order' : ', columns by their header'};{' '}
        {block.faults.length === 0 ? 'no cell is at fault' : `${String(block.faults.length)} to put right`}.
      </p>
      <Faults faults={block.faults} unknown={unknownAirfoils(block.rows, airfoilNames)} />
      <div role="region" aria-label="Stations read" tabIndex={0} className="max-h-80 overflow-auto">
        <table className="w-full border-collapse">
          <thead>
            <tr>
              <th scope="col" className="sticky top-0 h-8 bg-panel px-2 text-left font-medium">
                No.
              </th>
              {NUMBERS.map((field) => (
                <th
                  key={field}
                  scope="col"
                  className="sticky top-0 bg-panel px-2 text-right font-medium whitespace-nowrap"
                >
                  {STATION_RULES[field].label}
                  <span className="font-normal text-ink-soft">, {STATION_RULES[field].unit}</span>
                </th>
              ))}
              <th scope="col" className="sticky top-0 bg-panel px-2 text-left font-medium">
                Airfoil
              </th>
            </tr>
          </thead>
          <tbody>
            {block.rows.map((row, index) => (
              <Row key={index} row={row} index={index} faults={block.faults} />
            ))}
          </tbody>
        </table>
      </div>
    </div>
  );
}
