import { z } from 'zod';
import { quantity } from '../values/quantity.ts';
import { idValue, nameText, sha256 } from '../values/text.ts';

export const MAX_STATIONS = 200;
export const MIN_STATIONS = 2;

/** Ranges of a station's numbers: one place, read by forms, pasted blocks and the API. */
export const STATION_RULES = {
  radiusM: { label: 'Radius', unit: 'm', min: 0, max: 200, above: true },
  chordM: { label: 'Chord', unit: 'm', min: 0, max: 20 },
  twistDeg: { label: 'Twist', unit: '°', min: -45, max: 90 },
  thicknessPct: { label: 'Relative thickness', unit: '%', min: 1, max: 100 },
} as const;

/** One station of the blade. `airfoil` null: blended from the design's airfoils by relative thickness. */
export const station = z.strictObject({
  radiusM: quantity(STATION_RULES.radiusM),
  chordM: quantity(STATION_RULES.chordM),
  twistDeg: quantity(STATION_RULES.twistDeg),
  thicknessPct: quantity(STATION_RULES.thicknessPct),
  airfoil: nameText('Airfoil', 40).nullable(),
});
export type Station = z.infer<typeof station>;

/** An airfoil a design uses, pinned by the hash of its polar set so that it can never change underneath. */
export const pinnedAirfoil = z.strictObject({
  name: nameText('Airfoil name', 40),
  airfoilId: idValue('Airfoil'),
  polarSetHash: sha256,
});
export type PinnedAirfoil = z.infer<typeof pinnedAirfoil>;

export const solverSettings = z.strictObject({
  tipLoss: z.boolean(),
  hubLoss: z.boolean(),
  dragInInduction: z.boolean(),
  highInduction: z.enum(['buhl', 'glauert', 'straight-tangent']),
  elements: quantity({ label: 'Elements', unit: '', min: 10, max: 200, integer: true }),
  surfaceState: z.enum(['clean', 'soiled']),
});
export type SolverSettings = z.infer<typeof solverSettings>;

export const DEFAULT_SETTINGS: SolverSettings = {
  tipLoss: true,
  hubLoss: true,
  dragInInduction: true,
  highInduction: 'buhl',
  elements: 50,
  surfaceState: 'clean',
};

/** What a version freezes and a draft edits. */
export const designContent = z
  .strictObject({
    schema: z.literal(1),
    specificationIssue: quantity({
      label: 'Specification issue',
      unit: '',
      min: 1,
      max: 10000,
      integer: true,
    }),
    pitchDeg: quantity({ label: 'Pitch', unit: '°', min: -30, max: 90 }),
    designTipSpeedRatio: quantity({ label: 'Design tip-speed ratio', unit: '', min: 1, max: 20 }),
    settings: solverSettings,
    airfoils: z.array(pinnedAirfoil).max(24, 'Too many airfoils; allowed: at most 24'),
    stations: z
      .array(station)
      .min(MIN_STATIONS, `Too few stations; allowed: ${MIN_STATIONS} to ${MAX_STATIONS}`)
      .max(MAX_STATIONS, `Too many stations; allowed: ${MIN_STATIONS} to ${MAX_STATIONS}`),
  })
  .superRefine((content, context) => {
    content.stations.forEach((here, i) => {
      const before = content.stations[i - 1];
      if (before !== undefined && here.radiusM <= before.radiusM) {
        context.addIssue({
          code: 'custom',
          path: ['stations', i, 'radiusM'],
          message:
            here.radiusM === before.radiusM
              ? `Radius stands twice; allowed: each radius once, ascending`
              : `Radius is out of order; allowed: above ${before.radiusM} m, the station before`,
        });
      }
      if (here.airfoil !== null && !content.airfoils.some((foil) => foil.name === here.airfoil)) {
        context.addIssue({
          code: 'custom',
          path: ['stations', i, 'airfoil'],
          message: `Airfoil is not among the design's airfoils; allowed: ${content.airfoils.map((foil) => foil.name).join(', ') || 'none yet'} or blended`,
        });
      }
    });
    const names = content.airfoils.map((foil) => foil.name);
    names.forEach((name, i) => {
      if (names.indexOf(name) !== i)
        context.addIssue({
          code: 'custom',
          path: ['airfoils', i, 'name'],
          message: 'Airfoil name stands twice; allowed: each once',
        });
    });
  });
export type DesignContent = z.infer<typeof designContent>;

/**
 * A draft may be unfinished: what a person typed is kept even where it would be refused for a version, so that nothing
 * is lost. Cells that are not numbers are kept as text.
 */
export const draftStation = z.strictObject({
  radiusM: z.union([z.number(), z.string().max(200)]),
  chordM: z.union([z.number(), z.string().max(200)]),
  twistDeg: z.union([z.number(), z.string().max(200)]),
  thicknessPct: z.union([z.number(), z.string().max(200)]),
  airfoil: z.string().max(40).nullable(),
});
export type DraftStation = z.infer<typeof draftStation>;

export const draftContent = z.strictObject({
  schema: z.literal(1),
  specificationIssue: quantity({ label: 'Specification issue', unit: '', min: 1, max: 10000, integer: true }),
  pitchDeg: z.union([z.number(), z.string().max(200)]),
  designTipSpeedRatio: z.union([z.number(), z.string().max(200)]),
  settings: solverSettings,
  airfoils: z.array(pinnedAirfoil).max(24, 'Too many airfoils; allowed: at most 24'),
  stations: z.array(draftStation).max(MAX_STATIONS, `Too many stations; allowed: at most ${MAX_STATIONS}`),
});
export type DraftContent = z.infer<typeof draftContent>;
