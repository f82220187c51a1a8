export interface Cursors {
  /** Span cursor (m). */
  readonly radiusM: number | null;
  /** Operating cursor: the tip-speed ratio the spanwise plots show; null is the design's. */
  readonly tipSpeedRatio: number | null;
}

/** Where both cursors stand. Outside React state, so that a moving pointer redraws only what follows the cursor. */
export class CursorStore {
  private state: Cursors;
  private readonly listeners = new Set<() => void>();

  constructor(start: Cursors) {
    this.state = start;
  }

  readonly get = (): Cursors => this.state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
    };
  };

  readonly setRadius = (radiusM: number | null): void => {
    if (radiusM !== this.state.radiusM) this.set({ ...this.state, radiusM });
  };

  readonly setTipSpeedRatio = (tipSpeedRatio: number | null): void => {
    if (tipSpeedRatio !== this.state.tipSpeedRatio) this.set({ ...this.state, tipSpeedRatio });
  };

  private set(state: Cursors): void {
    this.state = state;
    for (const listener of this.listeners) listener();
  }
}

function numberOf(text: string | null): number | null {
  const value = text === null || text.trim() === '' ? NaN : Number(text);
  return Number.isFinite(value) && value > 0 ? value : null;
}

/** Cursors of a link: r in m, l the tip-speed ratio. Anything unreadable counts as none. */
export const cursorsOf = (query: URLSearchParams): Cursors => ({
  radiusM: numberOf(query.get('r')),
  tipSpeedRatio: numberOf(query.get('l')),
});

/** The query with both cursors in it, other parameters kept. */
export function withCursors(query: URLSearchParams, { radiusM, tipSpeedRatio }: Cursors): URLSearchParams {
  const next = new URLSearchParams(query);
  const write = (name: string, value: number | null, decimals: number) => {
    if (value === null) next.delete(name);
    else next.set(name, String(Number(value.toFixed(decimals))));
  };
  write('r', radiusM, 3);
  write('l', tipSpeedRatio, 2);
  return next;
}
