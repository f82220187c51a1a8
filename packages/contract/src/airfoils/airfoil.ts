import { z } from 'zod';
import { personRef } from '../people/person.ts';
import { quantity } from '../values/quantity.ts';
import { nameText, proseText } from '../values/text.ts';

const curve = (label: string, min: number, max: number) =>
  z
    .array(quantity({ label, unit: '', min, max }))
    .min(2, `${label}: too few rows; allowed: 2 to 2000`)
    .max(2000, `${label}: too many rows; allowed: 2 to 2000`);

/** One polar: coefficients against angle of attack at one Reynolds number and surface state. Columns have one length, α ascends. */
export const polar = z
  .strictObject({
    reynolds: quantity({ label: 'Reynolds number', unit: '', min: 1e3, max: 1e9 }),
    surfaceState: z.enum(['clean', 'soiled']),
    source: proseText('Source', 1000),
    alphaDeg: curve('Angle of attack', -180, 180),
    cl: curve('cl', -10, 10),
    cd: curve('cd', -1, 10),
    /** α where the attached range ends upward (maximum lift), used for the stall margin. Null: found from cl. */
    measuredFromDeg: quantity({
      label: 'Start of the measured range',
      unit: '°',
      min: -180,
      max: 180,
    }).nullable(),
    measuredToDeg: quantity({
      label: 'End of the measured range',
      unit: '°',
      min: -180,
      max: 180,
    }).nullable(),
  })
  .superRefine((table, context) => {
    if (table.cl.length !== table.alphaDeg.length)
      context.addIssue({
        code: 'custom',
        path: ['cl'],
        message: `cl has ${table.cl.length} rows; allowed: ${table.alphaDeg.length}, as α has`,
      });
    if (table.cd.length !== table.alphaDeg.length)
      context.addIssue({
        code: 'custom',
        path: ['cd'],
        message: `cd has ${table.cd.length} rows; allowed: ${table.alphaDeg.length}, as α has`,
      });
    table.alphaDeg.forEach((alpha, i) => {
      const before = table.alphaDeg[i - 1];
      if (before !== undefined && alpha <= before)
        context.addIssue({
          code: 'custom',
          path: ['alphaDeg', i],
          message: `α does not ascend; allowed: above ${before}°`,
        });
    });
  });
export type PolarData = z.infer<typeof polar>;

/** Closed outline from trailing edge over the upper side to the leading edge and back, chord 1. */
export const outline = z
  .array(
    z.tuple([
      quantity({ label: 'x/c', unit: '', min: -0.5, max: 1.5 }),
      quantity({ label: 'y/c', unit: '', min: -1, max: 1 }),
    ]),
  )
  .min(5, 'Too few coordinates; allowed: 5 to 500 points')
  .max(500, 'Too many coordinates; allowed: 5 to 500 points');

export const airfoilInput = z.strictObject({
  name: nameText('Airfoil name', 40),
  thicknessPct: quantity({ label: 'Relative thickness', unit: '%', min: 1, max: 100 }),
  note: proseText('Note', 1000),
  outline,
  polars: z.array(polar).min(1, 'No polar; allowed: 1 to 40').max(40, 'Too many polars; allowed: 1 to 40'),
});
export type AirfoilInput = z.infer<typeof airfoilInput>;

export const airfoilSummary = z.object({
  id: z.string(),
  name: z.string(),
  thicknessPct: z.number(),
  note: z.string(),
  polarSetHash: z.string(),
  polarCount: z.number(),
  reynolds: z.array(z.number()),
  surfaceStates: z.array(z.string()),
  addedBy: personRef,
  addedAt: z.string(),
});
export type AirfoilSummary = z.infer<typeof airfoilSummary>;

export const airfoil = airfoilSummary.extend({
  outline: z.array(z.tuple([z.number(), z.number()])),
  polars: z.array(polar),
});
export type Airfoil = z.infer<typeof airfoil>;
