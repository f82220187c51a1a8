import type { DesignContent, Evaluation } from '@tipward/contract';

/** Sections thicker than this are root fairings: their lift hardly matters and their stall is not a margin to keep. */
export const THICKEST_LIFTING_PCT = 45;
const OUTERMOST_SHARE = 0.97;

/** Smallest stall margin along the lifting span at the design point, with its radius; null where no section has one. */
export function smallestStallMargin(
  content: DesignContent,
  span: Evaluation['span'],
): { value: number; radiusM: number } | null {
  const tip = content.stations.at(-1)?.radiusM ?? 0;
  let smallest: { value: number; radiusM: number } | null = null;
  for (const point of span.points) {
    if (
      point.thicknessPct > THICKEST_LIFTING_PCT ||
      point.radiusM > OUTERMOST_SHARE * tip ||
      point.stallMarginDeg === null
    )
      continue;
    if (smallest === null || point.stallMarginDeg < smallest.value)
      smallest = { value: point.stallMarginDeg, radiusM: point.radiusM };
  }
  return smallest;
}
