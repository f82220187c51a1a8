import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

type Triple = readonly [number, number, number];

const css = readFileSync(new URL('./tokens.css', import.meta.url), 'utf8');

function tokensAfter(opening: string): Map<string, Triple> {
  const from = css.indexOf(opening);
  const block = css.slice(from, css.indexOf('}', from));
  return new Map(
    [...block.matchAll(/--([\w-]+): #(\w{2})(\w{2})(\w{2});/gu)].map(
      ([, name = '', r = '', g = '', b = '']) => [
        name,
        [r, g, b].map((pair) => linear(parseInt(pair, 16) / 255)) as unknown as Triple,
      ],
    ),
  );
}

/** sRGB to linear light, IEC 61966-2-1. */
function linear(value: number): number {
  return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
}

/** Relative luminance and contrast ratio, WCAG 2.2. */
const luminance = ([r, g, b]: Triple) => 0.2126 * r + 0.7152 * g + 0.0722 * b;
function contrast(one: Triple, other: Triple): number {
  const [low = 0, high = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (high + 0.05) / (low + 0.05);
}

const times = (m: readonly Triple[], v: Triple) =>
  m.map((row) => row[0] * v[0] + row[1] * v[1] + row[2] * v[2]) as unknown as Triple;

/** Full dichromacy: Machado, Oliveira & Fernandes 2009, severity 1.0 (matrices from memory). */
const VISION: Record<string, readonly Triple[]> = {
  ordinary: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
};

/** CIE L*a*b* (D65) of linear sRGB, CIE 15. */
function lab(rgb: Triple): Triple {
  const clipped = rgb.map((value) => Math.min(1, Math.max(0, value))) as unknown as Triple;
  const [x, y, z] = times(
    [
      [0.4124564, 0.3575761, 0.1804375],
      [0.2126729, 0.7151522, 0.072175],
      [0.0193339, 0.119192, 0.9503041],
    ],
    clipped,
  );
  const f = (t: number) => (t > (6 / 29) ** 3 ? Math.cbrt(t) : t / (3 * (6 / 29) ** 2) + 4 / 29);
  const [fx, fy, fz] = [f(x / 0.95047), f(y), f(z / 1.08883)];
  return [116 * fy - 16, 500 * (fx - fy), 200 * (fy - fz)];
}

const distance = (a: Triple, b: Triple) => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);

const THEMES = { light: tokensAfter(':root {'), dark: tokensAfter(":root[data-theme='dark'] {") };
const SERIES = [1, 2, 3, 4, 5, 6, 7].map((n) => `series-${String(n)}`);

/** Text on ground, at least 4.5:1. */
const TEXT: readonly (readonly [string, string])[] = [
  ...['paper', 'panel', 'sheet'].flatMap((ground) =>
    ['ink', 'ink-soft', 'accent', 'holds', 'look', 'fails'].map((text) => [text, ground] as const),
  ),
  ['accent-ink', 'accent'],
  ['paper', 'holds'],
  ['ink', 'accent-wash'],
  ...['holds', 'look', 'fails'].flatMap((name) => [
    ['ink', `${name}-wash`] as const,
    [name, `${name}-wash`] as const,
  ]),
];
/** What draws a shape or the edge of a control, at least 3:1. */
const SHAPES = ['rule-strong', ...SERIES].flatMap((name) => [
  [name, 'paper'] as const,
  [name, 'sheet'] as const,
]);

describe.each(Object.entries(THEMES))('the %s theme', (_name, tokens) => {
  const colour = (name: string) => {
    const found = tokens.get(name);
    if (found === undefined) throw new Error(`--${name} is not set`);
    return found;
  };

  it.each(TEXT)('reads --%s on --%s at 4.5:1', (text, ground) => {
    expect(contrast(colour(text), colour(ground))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(SHAPES)('shows --%s on --%s at 3:1', (shape, ground) => {
    expect(contrast(colour(shape), colour(ground))).toBeGreaterThanOrEqual(3);
  });

  it.each(Object.keys(VISION))('keeps the seven series apart under %s', (vision) => {
    const matrix = VISION[vision] ?? [];
    const seen = SERIES.map((name) => lab(times(matrix, colour(name))));
    const gaps = seen.flatMap((a, i) =>
      seen.slice(i + 1).map((b, j) => ({ pair: `${i + 1}–${i + j + 2}`, gap: distance(a, b) })),
    );
    const closest = gaps.toSorted((a, b) => a.gap - b.gap)[0];
    // About nine times the least difference an eye tells side by side (ΔE*ab 2.3, Mahy et al. 1994, from memory).
    expect(closest?.gap, `closest pair ${closest?.pair ?? ''}`).toBeGreaterThanOrEqual(20);
  });
});
