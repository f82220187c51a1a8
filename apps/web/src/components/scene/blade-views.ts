/** Named directions to look at a blade from. `up` keeps the span running left to right wherever it can be seen. */
export const BLADE_VIEWS = {
  suction: { label: 'Suction side', from: [0, 0, 1], up: [0, 1, 0], spanwise: true },
  pressure: { label: 'Pressure side', from: [0, 0, -1], up: [0, -1, 0], spanwise: true },
  edge: { label: 'Leading edge', from: [0, 1, 0], up: [0, 0, -1], spanwise: true },
  tip: { label: 'From the tip', from: [1, 0, 0], up: [0, 1, 0], spanwise: false },
  oblique: { label: 'Oblique', from: [0.55, 0.45, 0.7], up: [0, 1, 0], spanwise: false },
} as const;
export type BladeView = keyof typeof BLADE_VIEWS;

export const BLADE_VIEW_NAMES = Object.keys(BLADE_VIEWS) as readonly BladeView[];

/** Where the camera stands and looks so that the span lies on the shared pixel axis. */
export interface SpanFraming {
  /** px per metre, of the shared axis. */
  readonly zoom: number;
  /** Radius at the middle of the canvas (m). */
  readonly centreM: number;
  readonly distanceM: number;
}

export function spanFraming(axis: {
  hubRadiusM: number;
  tipRadiusM: number;
  left: number;
  right: number;
  width: number;
}): SpanFraming {
  const zoom = (axis.right - axis.left) / (axis.tipRadiusM - axis.hubRadiusM);
  return {
    zoom,
    centreM: axis.hubRadiusM + (axis.width / 2 - axis.left) / zoom,
    distanceM: 4 * axis.tipRadiusM,
  };
}
