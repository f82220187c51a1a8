import { z } from 'zod';

const maybe = z.number().nullable();

export const solverResultSection = z.strictObject({
  radiusM: z.number(),
  status: z.string(),
  inflowDeg: maybe,
  alphaDeg: maybe,
  axialInduction: maybe,
  tangentialInduction: maybe,
  lossFactor: maybe,
  cl: maybe,
  cd: maybe,
  relativeSpeedMS: maybe,
  normalForceNM: maybe,
  tangentialForceNM: maybe,
  reynolds: maybe,
  multipleRoots: z.boolean(),
});

export const solverResultPoint = z.strictObject({
  windSpeedMS: z.number(),
  rotorSpeedRpm: z.number(),
  tipSpeedRatio: z.number(),
  pitchDeg: z.number(),
  status: z.string(),
  cp: maybe,
  ct: maybe,
  cq: maybe,
  powerW: maybe,
  thrustN: maybe,
  torqueNm: maybe,
  rootFlapMomentNm: maybe,
  rootEdgeMomentNm: maybe,
  sections: z.array(solverResultSection).optional(),
});
export type SolverResultPoint = z.infer<typeof solverResultPoint>;

/** What the solver answers to a case; null where a quantity is undefined. */
export const solverResult = z.strictObject({
  solver: z.strictObject({ name: z.string(), version: z.string() }),
  points: z.array(solverResultPoint),
});
export type SolverResult = z.infer<typeof solverResult>;
