import type { SpanPoint } from '@tipward/contract';
import type { QuantityKind } from '@tipward/design-model';

/** A quantity along the span that can be plotted. */
export interface SpanQuantity {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly quantity: QuantityKind;
  readonly includeZero: boolean;
  readonly pick: (point: SpanPoint) => number | null;
}

const glideRatio = (point: SpanPoint): number | null =>
  point.cl === null || point.cd === null || point.cd <= 0 ? null : point.cl / point.cd;

export const CHORD: SpanQuantity = {
  id: 'chord',
  title: 'Chord',
  unit: 'm',
  quantity: 'chordM',
  includeZero: true,
  pick: (p) => p.chordM,
};
export const TWIST: SpanQuantity = {
  id: 'twist',
  title: 'Twist',
  unit: '°',
  quantity: 'twistDeg',
  includeZero: true,
  pick: (p) => p.twistDeg,
};

/** Those a person may choose between for the lower plots, in the order of the list. */
export const SPAN_QUANTITIES: readonly SpanQuantity[] = [
  {
    id: 'alpha',
    title: 'Angle of attack α and stall',
    unit: '°',
    quantity: 'angleDeg',
    includeZero: true,
    pick: (p) => p.alphaDeg,
  },
  {
    id: 'induction',
    title: 'Axial induction a',
    unit: '',
    quantity: 'induction',
    includeZero: true,
    pick: (p) => p.axialInduction,
  },
  {
    id: 'lift',
    title: 'Lift coefficient cl',
    unit: '',
    quantity: 'coefficient',
    includeZero: true,
    pick: (p) => p.cl,
  },
  {
    id: 'normal-force',
    title: 'Normal force',
    unit: 'N/m',
    quantity: 'forceNM',
    includeZero: true,
    pick: (p) => p.normalForceNM,
  },
  {
    id: 'tangential-force',
    title: 'Tangential force',
    unit: 'N/m',
    quantity: 'forceNM',
    includeZero: true,
    pick: (p) => p.tangentialForceNM,
  },
  {
    id: 'stall-margin',
    title: 'Margin to stall',
    unit: '°',
    quantity: 'angleDeg',
    includeZero: true,
    pick: (p) => p.stallMarginDeg,
  },
  {
    id: 'tangential-induction',
    title: 'Tangential induction a′',
    unit: '',
    quantity: 'induction',
    includeZero: true,
    pick: (p) => p.tangentialInduction,
  },
  {
    id: 'inflow',
    title: 'Inflow angle φ',
    unit: '°',
    quantity: 'angleDeg',
    includeZero: true,
    pick: (p) => p.inflowDeg,
  },
  {
    id: 'glide-ratio',
    title: 'Lift to drag cl/cd',
    unit: '',
    quantity: 'speedMS',
    includeZero: true,
    pick: glideRatio,
  },
  {
    id: 'loss-factor',
    title: 'Loss factor F',
    unit: '',
    quantity: 'factor',
    includeZero: true,
    pick: (p) => p.lossFactor,
  },
  {
    id: 'thickness',
    title: 'Relative thickness',
    unit: '%',
    quantity: 'thicknessPct',
    includeZero: true,
    pick: (p) => p.thicknessPct,
  },
  {
    id: 'speed',
    title: 'Relative speed W',
    unit: 'm/s',
    quantity: 'speedMS',
    includeZero: true,
    pick: (p) => p.relativeSpeedMS,
  },
  {
    id: 'reynolds',
    title: 'Reynolds number',
    unit: '',
    quantity: 'reynolds',
    includeZero: true,
    pick: (p) => p.reynolds,
  },
];
