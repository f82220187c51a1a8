// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { CurvePlot } from './curve-plot.tsx';

afterEach(cleanup);

function show(cursorX: number | null) {
  const onCursor = vi.fn();
  render(
    <CurvePlot
      title="Power coefficient CP"
      unit=""
      quantity="cp"
      xTitle="Tip-speed ratio λ"
      xUnit=""
      xQuantity="lambda"
      xSymbol="λ"
      series={[
        {
          id: 'draft',
          label: 'draft',
          kind: 'solid',
          colorIndex: 0,
          points: [
            [1, 0.05],
            [7, 0.48],
            [12, null],
          ],
        },
      ]}
      cursorX={cursorX}
      onCursor={onCursor}
      marks={[{ x: 7, y: 0.48, label: 'CP 0.4800 at λ 7.00', colorIndex: 0 }]}
    />,
  );
  return { onCursor, slider: screen.getByRole('slider') };
}

describe('CurvePlot', () => {
  it('marks the maximum and reads the operating cursor', () => {
    const { slider } = show(7);
    expect(slider.getAttribute('aria-valuetext')).toBe('λ 7.00: draft 0.4800');
    expect(slider.textContent).toContain('CP 0.4800 at λ 7.00');
  });
  it('says unknown where there is no value, never zero', () => {
    expect(show(10).slider.getAttribute('aria-valuetext')).toBe('λ 10.00: draft unknown');
  });
  it('takes its cursor by arrows and by drag, not by passing over', () => {
    const { slider, onCursor } = show(7);
    fireEvent.pointerMove(slider, { clientX: 200, buttons: 0 });
    expect(onCursor).not.toHaveBeenCalled();
    fireEvent.keyDown(slider, { key: 'ArrowRight' });
    fireEvent.pointerMove(slider, { clientX: 52, buttons: 1 });
    expect(onCursor.mock.calls.map(([x]) => x as number)).toEqual([7.1, 1]);
  });
});
