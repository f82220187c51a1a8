import { classNames } from '../class-names.ts';
import type { Column, SortState } from './column.ts';

const ARROWS = { ascending: '▲', descending: '▼', none: '' } as const;

/** On the side where it does not push figures out of line with their head. */
function Arrow({ direction }: { direction: keyof typeof ARROWS }) {
  return (
    <span aria-hidden="true" className="inline-block w-4 text-center text-[9px] text-accent">
      {ARROWS[direction]}
    </span>
  );
}

function HeadCell<Row>({
  column,
  sort,
  onSort,
}: {
  column: Column<Row>;
  sort: SortState | null;
  onSort: (sort: SortState) => void;
}) {
  const mine = sort?.columnId === column.id ? sort : null;
  const direction = mine === null ? 'none' : mine.descending ? 'descending' : 'ascending';
  const label = (
    <>
      {column.header}
      {column.unit !== undefined && column.unit !== '' && (
        <span className="font-normal text-ink-soft">, {column.unit}</span>
      )}
    </>
  );
  return (
    <th
      scope="col"
      aria-sort={column.sort === undefined ? undefined : direction}
      className={classNames(
        'sticky top-0 z-10 h-8 bg-panel px-2 font-medium whitespace-nowrap',
        column.numeric === true ? 'text-right' : 'text-left',
        column.wideOnly === true && 'max-sm:hidden',
      )}
    >
      {column.sort === undefined ? (
        label
      ) : (
        <button
          type="button"
          className="cursor-pointer border-0 bg-transparent p-0 font-medium hover:text-accent"
          onClick={() => {
            onSort({ columnId: column.id, descending: mine !== null && !mine.descending });
          }}
        >
          {column.numeric === true && <Arrow direction={direction} />}
          {label}
          {column.numeric !== true && <Arrow direction={direction} />}
        </button>
      )}
    </th>
  );
}

export function TableHead<Row>({
  columns,
  sort,
  onSort,
}: {
  columns: readonly Column<Row>[];
  sort: SortState | null;
  onSort: (sort: SortState) => void;
}) {
  return (
    <thead>
      <tr>
        {columns.map((column) => (
          <HeadCell key={column.id} column={column} sort={sort} onSort={onSort} />
        ))}
      </tr>
    </thead>
  );
}
