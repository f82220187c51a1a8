/**
 * Shapes of the invented SM family: the published 4-digit thickness form on a parabolic camber line.
 * Source of the form: I. H. Abbott and A. E. von Doenhoff, Theory of Wing Sections, Dover 1959, sections 6.4–6.6
 * (coefficients from memory); trailing edge closed by the last coefficient.
 */
function halfThickness(x: number, thickness: number): number {
  return (
    5 * thickness * (0.2969 * Math.sqrt(x) - 0.126 * x - 0.3516 * x ** 2 + 0.2843 * x ** 3 - 0.1036 * x ** 4)
  );
}

function camber(x: number, largest: number): number {
  return 4 * largest * x * (1 - x);
}

/** Outline with chord 1: trailing edge, upper side, leading edge, lower side, trailing edge; `count` points a side. */
export function camberedOutline(thicknessPct: number, camberShare: number, count = 40): [number, number][] {
  const side = (sign: 1 | -1) =>
    Array.from({ length: count + 1 }, (_, i): [number, number] => {
      const x = 0.5 * (1 + Math.cos((Math.PI * i) / count));
      return [x, camber(x, camberShare) + sign * halfThickness(x, thicknessPct / 100)];
    });
  const lower = side(-1).toReversed();
  return [...side(1), ...lower.slice(1)].map(([x, y]) => [Number(x.toFixed(6)), Number(y.toFixed(6))]);
}

/** A circle of diameter 1 as an outline. */
export function circleOutline(count = 80): [number, number][] {
  return Array.from({ length: count + 1 }, (_, i): [number, number] => {
    const turn = (2 * Math.PI * i) / count;
    return [Number((0.5 + 0.5 * Math.cos(turn)).toFixed(6)), Number((0.5 * Math.sin(turn)).toFixed(6))];
  });
}
