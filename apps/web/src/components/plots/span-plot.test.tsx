// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SpanAxis } from './span-axis.tsx';
import { SpanPlot } from './span-plot.tsx';
import type { PlotSeries } from './plot-series.ts';

afterEach(cleanup);

const series: PlotSeries[] = [
  {
    id: 'v2',
    label: 'v2',
    kind: 'dashed',
    colorIndex: 1,
    points: [
      [1, 0.5],
      [6, 0.25],
    ],
  },
  {
    id: 'draft',
    label: 'draft',
    kind: 'solid',
    colorIndex: 0,
    points: [
      [1, 0.6],
      [6, 0.1],
    ],
  },
];

function show(cursorRadiusM: number | null, onCursor = vi.fn()) {
  render(
    <SpanAxis hubRadiusM={1} tipRadiusM={6}>
      <SpanPlot
        title="Chord"
        unit="m"
        quantity="chordM"
        series={series}
        cursorRadiusM={cursorRadiusM}
        onCursor={onCursor}
        differenceBaseId="v2"
      />
    </SpanAxis>,
  );
  return { onCursor, slider: screen.getByRole('slider', { name: 'Chord, m: span cursor' }) };
}

describe('SpanPlot', () => {
  it('reads every line at the cursor, with units', () => {
    const { slider } = show(3.5);
    expect(slider.getAttribute('aria-valuetext')).toBe('r 3.500 m: v2 0.375 m, draft 0.350 m');
  });
  it('draws what is in hand solid, the reference dashed, and the difference beneath', () => {
    const { slider } = show(null);
    const path = (id: string) => slider.querySelector(`path[data-series="${id}"]`);
    expect(path('draft')?.getAttribute('stroke-dasharray')).toBeNull();
    expect(path('v2')?.getAttribute('stroke-dasharray')).toBeTruthy();
    const strip = slider.querySelector('[data-part="difference-strip"]');
    expect(strip?.querySelectorAll('path')).toHaveLength(1);
    expect(strip?.textContent).toContain('±0.150');
  });
  it('moves the cursor with arrows, Shift, Home and End, and stays on the blade', () => {
    const { slider, onCursor } = show(5.98);
    fireEvent.keyDown(slider, { key: 'ArrowLeft' });
    fireEvent.keyDown(slider, { key: 'ArrowRight' });
    fireEvent.keyDown(slider, { key: 'ArrowLeft', shiftKey: true });
    fireEvent.keyDown(slider, { key: 'Home' });
    expect(onCursor.mock.calls.map(([r]) => Number((r as number).toFixed(6)))).toEqual([5.93, 6, 5.48, 1]);
  });
  it('follows the pointer on the shared pixel axis', () => {
    const { slider, onCursor } = show(null);
    fireEvent.pointerMove(slider, { clientX: 52 });
    fireEvent.pointerMove(slider, { clientX: (52 + 580) / 2 });
    fireEvent.pointerMove(slider, { clientX: 2000 });
    expect(onCursor.mock.calls.map(([r]) => r as number)).toEqual([1, 3.5, 6]);
  });
  it('shows its numbers as a table', async () => {
    show(2);
    await userEvent.click(screen.getByRole('button', { name: 'Show Chord as a table' }));
    const rows = within(screen.getByRole('table')).getAllByRole('row');
    expect(rows.map((row) => row.textContent)).toEqual([
      'Radius, mv2draft',
      '1.0000.5000.600',
      '6.0000.2500.100',
    ]);
    expect(screen.queryByRole('slider')).toBeNull();
  });
});
