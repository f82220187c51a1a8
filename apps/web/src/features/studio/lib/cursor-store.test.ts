import { describe, expect, it, vi } from 'vitest';
import { CursorStore, cursorsOf, withCursors } from './cursor-store.ts';

describe('cursors', () => {
  it('come from a link and go back into it, other parameters kept', () => {
    const query = new URLSearchParams('ref=abc&r=4.21&l=7.5');
    expect(cursorsOf(query)).toEqual({ radiusM: 4.21, tipSpeedRatio: 7.5 });
    expect(withCursors(query, { radiusM: 5.00049, tipSpeedRatio: null }).toString()).toBe('ref=abc&r=5');
  });
  it.each(['r=abc', 'r=NaN', 'r=-1', 'r=', 'r=1e999'])('count %s as none', (text) => {
    expect(cursorsOf(new URLSearchParams(text)).radiusM).toBeNull();
  });
  it('tell listeners only what changed', () => {
    const store = new CursorStore({ radiusM: 1, tipSpeedRatio: null });
    const listener = vi.fn();
    store.subscribe(listener);
    store.setRadius(1);
    expect(listener).not.toHaveBeenCalled();
    store.setRadius(2);
    expect(listener).toHaveBeenCalledTimes(1);
  });
});
