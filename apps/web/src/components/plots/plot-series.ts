/** One line of a plot. Points ascend in x; a null y breaks the line, it is never drawn as zero. */
export interface PlotSeries {
  readonly id: string;
  /** Short name, written at the line's end ('v3', 'draft'). */
  readonly label: string;
  readonly points: readonly (readonly [number, number | null])[];
  /** Solid is in hand, dashed is what it is compared with. */
  readonly kind: 'solid' | 'dashed';
  /** 0 to 6: place in the fixed series colours; dashed lines take their pattern from it as well. */
  readonly colorIndex: number;
  /** A bound that belongs to another line (the angle of stall, say): drawn and read, never subtracted from anything. */
  readonly bound?: true;
}

/** A point of a plot that carries a name of its own: a maximum, say. */
export interface PlotMark {
  readonly x: number;
  readonly y: number;
  readonly label: string;
  readonly colorIndex: number;
}

/** A limit a plot is held against, drawn across it. */
export interface PlotLimit {
  readonly value: number;
  readonly label: string;
}

const DASHES = ['6 4', '2 3', '9 3 2 3', '12 4', '4 2', '1 4', '9 3 2 3 2 3'] as const;
const SERIES_COUNT = 7;

export function seriesColor(colorIndex: number): string {
  return `var(--series-${(((colorIndex % SERIES_COUNT) + SERIES_COUNT) % SERIES_COUNT) + 1})`;
}

/** Dash pattern of a line: none when solid, so that a line is told apart without its colour. */
export function seriesDash(series: Pick<PlotSeries, 'kind' | 'colorIndex'>): string | undefined {
  return series.kind === 'solid' ? undefined : DASHES[Math.abs(series.colorIndex) % DASHES.length];
}
