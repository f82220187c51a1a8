import { describe, expect, it } from 'vitest';
import { spanAxis } from '../plots/span-axis-context.ts';
import { BLADE_VIEWS, BLADE_VIEW_NAMES, spanFraming } from './blade-views.ts';

type Vector = readonly [number, number, number];
const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

describe('blade views', () => {
  it('put a radius on the pixel the plots put it on', () => {
    const axis = spanAxis(1.6, 63, 700);
    const { zoom, centreM } = spanFraming(axis);
    for (const radiusM of [1.6, 20, 63])
      expect(axis.width / 2 + (radiusM - centreM) * zoom).toBeCloseTo(axis.scale(radiusM), 9);
  });
  it.each(BLADE_VIEW_NAMES.filter((name) => BLADE_VIEWS[name].spanwise))(
    'runs the span to the right seen from the %s side',
    (name) => {
      const view = BLADE_VIEWS[name];
      // Right of the picture: up × (towards the eye).
      expect(cross(view.up, view.from)[0]).toBeGreaterThan(0);
    },
  );
});
