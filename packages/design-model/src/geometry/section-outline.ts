import type { AirfoilData } from '../airfoil-data.ts';
import { mixFor } from '../airfoil-data.ts';

type Point = readonly [number, number];

/** y at x on one side, whose points ascend in x; linear between points. */
function heightAt(side: readonly Point[], x: number): number {
  const above = side.findIndex((point) => point[0] >= x);
  if (above === -1) return side.at(-1)?.[1] ?? 0;
  const right = side[above];
  const left = side[above - 1];
  if (right === undefined) return 0;
  if (left === undefined || right[0] === left[0]) return right[1];
  return left[1] + ((x - left[0]) / (right[0] - left[0])) * (right[1] - left[1]);
}

/** The outline with `count` points on cosine-spaced x: trailing edge, upper side, leading edge, lower side, trailing edge. */
function resampleOutline(outline: readonly Point[], count: number): Float64Array {
  const nose = outline.reduce(
    (best, point, i) => (point[0] < (outline[best]?.[0] ?? Infinity) ? i : best),
    0,
  );
  const upper = outline.slice(0, nose + 1).toReversed();
  const lower = outline.slice(nose);
  const ys = new Float64Array(count);
  for (let i = 0; i < count; i += 1) {
    const turn = i / (count - 1);
    const x = outlineX(turn);
    ys[i] = turn <= 0.5 ? heightAt(upper, x) : heightAt(lower, x);
  }
  return ys;
}

/** x/c at a share of the way round (0 trailing edge, ½ leading edge, 1 trailing edge), cosine-spaced. */
export function outlineX(turn: number): number {
  return 0.5 * (1 + Math.cos(2 * Math.PI * turn));
}

/** Heights of the section of a relative thickness: blended from the neighbours in thickness, or a named airfoil's own. */
export function sectionHeights(
  airfoils: readonly AirfoilData[],
  thicknessPct: number,
  named: string | null,
  count: number,
  cache = new Map<string, Float64Array>(),
): Float64Array {
  const resampled = (foil: AirfoilData) => {
    const held = cache.get(foil.polarSetHash);
    if (held !== undefined) return held;
    const ys = resampleOutline(foil.outline, count);
    cache.set(foil.polarSetHash, ys);
    return ys;
  };
  const { a, b, weightB } = mixFor(airfoils, thicknessPct, named);
  const ya = resampled(a);
  const yb = resampled(b);
  return ya.map((y, i) => y + weightB * ((yb[i] ?? y) - y));
}

/** Chordwise place of the pitch axis: quarter chord on airfoils, going to mid-chord on the round root. Common practice. */
export function pitchAxisShare(thicknessPct: number): number {
  return 0.25 + 0.25 * Math.min(1, Math.max(0, (thicknessPct - 40) / 60));
}
