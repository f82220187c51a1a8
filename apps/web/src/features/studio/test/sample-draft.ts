import { DEFAULT_SETTINGS } from '@tipward/contract';
import type { DraftContent } from '@tipward/contract';

/** A draft of `count` stations for tests; radii 1, 2, 3 … m. */
export function sampleDraft(count = 4): DraftContent {
  return {
    schema: 1,
    specificationIssue: 1,
    pitchDeg: 0,
    designTipSpeedRatio: 7,
    settings: DEFAULT_SETTINGS,
    airfoils: [],
    stations: Array.from({ length: count }, (_, i) => ({
      radiusM: i + 1,
      chordM: Number((0.8 - 0.1 * i).toFixed(3)),
      twistDeg: 12 - 2 * i,
      thicknessPct: 30 - i,
      airfoil: null,
    })),
  };
}
