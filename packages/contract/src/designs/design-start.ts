import { z } from 'zod';
import { idValue } from '../values/text.ts';
import { draftStation, MAX_STATIONS } from './content.ts';
import { quantity } from '../values/quantity.ts';

/** How a design begins: sized from the specification, from given stations (pasted or read from CSV), empty, or forked from a version. */
export const designStart = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('sized'),
    airfoilIds: z
      .array(idValue('Airfoil'))
      .min(1, 'No airfoil; allowed: 1 to 24')
      .max(24, 'Too many airfoils; allowed: 1 to 24'),
    tipSpeedRatio: quantity({ label: 'Design tip-speed ratio', unit: '', min: 1, max: 20 }),
    designLift: quantity({ label: 'Design lift coefficient', unit: '', min: 0.1, max: 2 }),
    maxChordM: quantity({ label: 'Chord cap', unit: 'm', min: 0, max: 20, above: true }).nullable(),
    stationCount: quantity({ label: 'Stations', unit: '', min: 5, max: 60, integer: true }),
  }),
  z.strictObject({
    kind: z.literal('stations'),
    airfoilIds: z.array(idValue('Airfoil')).max(24, 'Too many airfoils; allowed: at most 24'),
    stations: z.array(draftStation).max(MAX_STATIONS, `Too many stations; allowed: at most ${MAX_STATIONS}`),
  }),
  z.strictObject({ kind: z.literal('fork'), versionId: idValue('Version') }),
]);
export type DesignStart = z.infer<typeof designStart>;
