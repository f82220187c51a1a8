import { z } from 'zod';

const maybe = z.number().nullable();

/** The rotor curve at one pitch; the arrays have one length. */
export const rotorCurve = z.object({
  pitchDeg: z.number(),
  tipSpeedRatio: z.array(z.number()),
  cp: z.array(maybe),
  ct: z.array(maybe),
});
export type RotorCurve = z.infer<typeof rotorCurve>;

/** One element of the span at the design point. Null where a quantity is undefined. */
export const spanPoint = z.object({
  radiusM: z.number(),
  chordM: z.number(),
  twistDeg: z.number(),
  thicknessPct: z.number(),
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
  stallMarginDeg: maybe,
});
export type SpanPoint = z.infer<typeof spanPoint>;

/** One wind speed of the operating schedule. `governedBy` says what holds the rotor there. */
export const operatingPoint = z.object({
  windSpeedMS: z.number(),
  rotorSpeedRpm: z.number(),
  pitchDeg: z.number(),
  tipSpeedRatio: z.number(),
  governedBy: z.string(),
  status: z.string(),
  cp: maybe,
  ct: maybe,
  powerKW: maybe,
  electricalPowerKW: maybe,
  thrustKN: maybe,
  rootFlapMomentKNm: maybe,
  rootEdgeMomentKNm: maybe,
});
export type OperatingPoint = z.infer<typeof operatingPoint>;

export const keyNumbers = z.object({
  maxCp: maybe,
  tipSpeedRatioAtMaxCp: maybe,
  ctAtMaxCp: maybe,
  energyGrossMWh: maybe,
  energyNetMWh: maybe,
  capacityFactor: maybe,
  ratedWindSpeedMS: maybe,
  maxThrustKN: maybe,
  maxRootFlapMomentKNm: maybe,
  maxRootEdgeMomentKNm: maybe,
  maxTipSpeedMS: maybe,
  maxChordM: z.number(),
  solidity: z.number(),
  planformAreaM2: z.number(),
  minStallMarginDeg: maybe,
});
export type KeyNumbers = z.infer<typeof keyNumbers>;

/** A requirement held against a result. `at` is the wind speed (m/s) or radius (m) that governs. */
export const verdict = z.object({
  kind: z.string(),
  label: z.string(),
  unit: z.string(),
  bound: z.enum(['upper', 'lower']),
  limit: z.number(),
  value: maybe,
  margin: maybe,
  verdict: z.enum(['holds', 'fails', 'unknown']),
  at: z
    .object({ quantity: z.enum(['wind-speed', 'radius', 'tip-speed-ratio']), value: z.number() })
    .nullable(),
  reason: z.string(),
});
export type Verdict = z.infer<typeof verdict>;

export const warning = z.object({
  code: z.string(),
  message: z.string(),
  /** Index of the station concerned, null for the rotor as a whole. */
  station: z.number().int().nullable(),
});
export type Warning = z.infer<typeof warning>;

/** All that the solver says of one content under one specification; reproducible from its keys. */
export const evaluation = z.object({
  solver: z.object({ name: z.string(), version: z.string() }),
  contentHash: z.string(),
  specificationHash: z.string(),
  curve: rotorCurve,
  span: z.object({
    tipSpeedRatio: z.number(),
    windSpeedMS: z.number(),
    pitchDeg: z.number(),
    points: z.array(spanPoint),
  }),
  schedule: z.array(operatingPoint),
  keyNumbers,
  verdicts: z.array(verdict),
  warnings: z.array(warning),
});
export type Evaluation = z.infer<typeof evaluation>;
