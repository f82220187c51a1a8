import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it } from 'vitest';
import type { Column } from './column.ts';
import { DataTable } from './data-table.tsx';

afterEach(cleanup);

interface Row {
  name: string;
  cp: number;
}
const rows: Row[] = [
  { name: 'first', cp: 0.45 },
  { name: 'second', cp: 0.47 },
];
const columns: Column<Row>[] = [
  {
    id: 'name',
    header: 'Name',
    cell: ({ name }) => <a href={`/${name}`}>{name}</a>,
    text: ({ name }) => name,
  },
  { id: 'cp', header: 'CP', numeric: true, cell: ({ cp }) => cp, sort: ({ cp }) => cp },
];
const links = () => screen.getAllByRole('link').map((link) => link.textContent);

it('sorts by a head, says so, filters, and moves from row to row by arrows', async () => {
  const user = userEvent.setup();
  render(
    <DataTable
      label="Blades"
      rows={rows}
      columns={columns}
      rowKey={({ name }) => name}
      empty="none"
      toolsFrom={0}
    />,
  );
  const head = screen.getByRole('columnheader', { name: /CP/u });
  await user.click(within(head).getByRole('button'));
  await user.click(within(head).getByRole('button'));
  expect(head.getAttribute('aria-sort')).toBe('descending');
  expect(links()).toEqual(['second', 'first']);
  screen.getByRole('link', { name: 'second' }).focus();
  await user.keyboard('{ArrowDown}');
  expect(document.activeElement?.textContent).toBe('first');
  await user.type(screen.getByRole('searchbox'), 'sec');
  expect(links()).toEqual(['second']);
  expect(screen.getByRole('status').textContent).toBe('1 of 2');
});

it('shows the empty state instead of an empty table', () => {
  render(
    <DataTable
      label="Blades"
      rows={[]}
      columns={columns}
      rowKey={({ name }) => name}
      empty={<p>No blade yet</p>}
    />,
  );
  expect(screen.getByText('No blade yet')).toBeTruthy();
  expect(screen.queryByRole('table')).toBeNull();
});
