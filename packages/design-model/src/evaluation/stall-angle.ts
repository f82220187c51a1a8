import type { PolarTable } from '@tipward/bem-solver';

/** α of maximum lift in degrees: the first maximum of cl above zero lift up to 30°. Null where lift never rises (a cylinder). */
export function stallAngleDeg(table: PolarTable): number | null {
  let best: number | null = null;
  let bestLift = 0.2;
  for (let i = 0; i < table.alphaDeg.length; i += 1) {
    const alpha = table.alphaDeg[i] ?? 0;
    const cl = table.cl[i] ?? 0;
    if (alpha < -5 || alpha > 30) continue;
    if (cl > bestLift) {
      bestLift = cl;
      best = alpha;
    } else if (best !== null && cl < bestLift - 0.02) break;
  }
  return best;
}
