import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { checkDraft } from '@tipward/design-model';
import { useReducer } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { notesByRow } from '../lib/row-notes.ts';
import { startState, studioReducer } from '../lib/studio-reducer.ts';
import { sampleDraft } from '../test/sample-draft.ts';
import { StationGrid } from './station-grid.tsx';

afterEach(cleanup);

function Bench({ count }: { count: number }) {
  const [state, dispatch] = useReducer(studioReducer, sampleDraft(count), startState);
  return (
    <>
      <button
        onClick={() => {
          dispatch({ type: 'undo' });
        }}
      >
        Undo
      </button>
      <output>{state.past.map((step) => step.label).join('; ')}</output>
      <StationGrid
        content={state.content}
        dispatch={dispatch}
        notes={notesByRow(checkDraft(state.content).faults, [])}
        reference={null}
        cursorRow={null}
        onRow={() => undefined}
      />
    </>
  );
}

function open(count = 4) {
  render(<Bench count={count} />);
  const grid = screen.getByRole('grid', { name: 'Station table' });
  grid.focus();
  return { grid, user: userEvent.setup() };
}

const cell = (row: number, column: number) => {
  const found = document.querySelector(`[data-row="${row}"][data-column="${column}"]`);
  if (!(found instanceof HTMLElement)) throw new Error(`No cell ${row}, ${column}`);
  return found;
};
const active = () => {
  const id = screen.getByRole('grid').getAttribute('aria-activedescendant') ?? '';
  const found = document.getElementById(id);
  return [Number(found?.dataset['row']), Number(found?.dataset['column'])];
};
const column = (index: number, rows: number) =>
  Array.from({ length: rows }, (_, row) => cell(row, index).textContent);
const clipboard = (text: string) => ({ clipboardData: { getData: () => text } });

describe('StationGrid', () => {
  it('moves by arrows and stops at the edges', async () => {
    const { user } = open();
    await user.keyboard('{ArrowUp}{ArrowLeft}');
    expect(active()).toEqual([0, 0]);
    await user.keyboard('{ArrowDown}{ArrowRight}{ArrowRight}');
    expect(active()).toEqual([1, 2]);
    await user.keyboard('{Control>}{End}{/Control}');
    expect(active()).toEqual([3, 4]);
    await user.keyboard('{ArrowRight}{ArrowDown}{Home}');
    expect(active()).toEqual([3, 0]);
  });
  it('types over a cell, answers at every key, and Enter goes down', async () => {
    const { user, grid } = open();
    await user.keyboard('{ArrowRight}0.55');
    expect(within(grid).getByRole('textbox', { name: 'Chord, m, station 1' })).toHaveProperty(
      'value',
      '0.55',
    );
    await user.keyboard('{Enter}');
    expect(cell(0, 1).textContent).toBe('0.550');
    expect(active()).toEqual([1, 1]);
    expect(document.activeElement).toBe(grid);
    expect(screen.getByRole('status').textContent).toBe('Chord at station 1');
  });
  it('opens with F2 at full precision, and Escape takes the edit back without a step', async () => {
    const { user } = open();
    await user.keyboard('{ArrowRight}{F2}');
    expect(screen.getByRole('textbox')).toHaveProperty('value', '0.8');
    await user.keyboard('5{Escape}');
    expect(cell(0, 1).textContent).toBe('0.800');
    expect(screen.getByRole('status').textContent).toBe('');
  });
  it('walks by Tab, and lets go after Escape', async () => {
    const { user, grid } = open();
    await user.keyboard('{Tab}{Tab}');
    expect(active()).toEqual([0, 2]);
    await user.keyboard('{Shift>}{Tab}{/Shift}');
    expect(active()).toEqual([0, 1]);
    await user.keyboard('7{Tab}');
    expect(active()).toEqual([0, 2]);
    await user.keyboard('{Escape}{Tab}');
    expect(document.activeElement).not.toBe(grid);
  });
  it('selects ranges and copies them with headers', async () => {
    const { user, grid } = open();
    await user.keyboard('{ArrowRight}{Shift>}{ArrowDown}{ArrowRight}{/Shift}');
    expect(document.querySelectorAll('[aria-selected="true"]')).toHaveLength(4);
    const setData = vi.fn();
    fireEvent.copy(grid, { clipboardData: { setData } });
    expect(setData).toHaveBeenCalledWith('text/plain', 'Chord [m]\tTwist [°]\r\n0.8\t12\r\n0.7\t10');
  });
  it('pastes a block as one step; a bad cell stays as text, marked with its fault', async () => {
    const { user, grid } = open();
    await user.keyboard('{ArrowRight}');
    fireEvent.paste(grid, clipboard('0.61\t11\n0,52\t9\n'));
    expect(column(1, 2)).toEqual(['0.610', '0,52']);
    expect(cell(1, 1).getAttribute('aria-invalid')).toBe('true');
    expect(cell(1, 1).title).toBe('Chord has a decimal comma; allowed: a number with a point, such as 0.52');
    expect(cell(1, 2).textContent).toBe('9.00');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(column(1, 2)).toEqual(['0.800', '0.700']);
  });
  it('inserts, deletes, fills and empties', async () => {
    const { user } = open();
    await user.keyboard('{Insert}');
    expect(column(0, 5)).toEqual(['1.000', '1.500', '2.000', '3.000', '4.000']);
    expect(active()).toEqual([1, 0]);
    await user.keyboard('{Shift>}{Delete}{/Shift}');
    expect(column(0, 4)).toEqual(['1.000', '2.000', '3.000', '4.000']);
    await user.keyboard(
      '{Control>}{Home}{/Control}{ArrowRight}{Shift>}{ArrowDown}{ArrowDown}{/Shift}{Control>}d{/Control}',
    );
    expect(column(1, 4)).toEqual(['0.800', '0.800', '0.800', '0.500']);
    await user.keyboard('{Delete}');
    expect(column(1, 4)).toEqual(['', '', '', '0.500']);
    expect(cell(0, 1).getAttribute('aria-invalid')).toBe('true');
  });
  it('tells a doubled radius beside the row', async () => {
    const { user } = open();
    await user.keyboard('{ArrowDown}1{Enter}');
    expect(screen.getAllByText(/Radius stands twice/u).length).toBeGreaterThan(0);
  });
  it('draws only the row that changed among 200', async () => {
    const { user } = open(200);
    const before = cell(150, 1).parentElement;
    const seen: Node[] = [];
    const observer = new MutationObserver((records) => seen.push(...records.map((record) => record.target)));
    observer.observe(screen.getByRole('grid'), {
      subtree: true,
      childList: true,
      characterData: true,
      attributes: true,
    });
    await user.keyboard('{ArrowRight}0.5{Enter}');
    observer.disconnect();
    const rows = new Set(
      seen.map((node) => (node instanceof Element ? node : node.parentElement)?.closest('tr')?.rowIndex),
    );
    expect([...rows].filter((row) => row !== undefined).sort()).toEqual([1, 2]);
    expect(cell(150, 1).parentElement).toBe(before);
  });
});
