import { z } from 'zod';

interface Range {
  readonly min?: number;
  readonly max?: number;
  /** The minimum itself is refused. */
  readonly above?: boolean;
  readonly integer?: boolean;
  readonly unit?: string;
}

function allowedOf({ min, max, above, integer, unit }: Range): string {
  const parts = [
    ...(min === undefined ? [] : [`${above === true ? 'above' : 'at least'} ${min}`]),
    ...(max === undefined ? [] : [`at most ${max}`]),
  ];
  const kind = integer === true ? 'a whole number' : 'a finite number';
  const bounds = parts.length === 0 ? '' : ` ${parts.join(' and ')}`;
  return `allowed: ${kind}${bounds}${unit === undefined ? '' : ` ${unit}`}`;
}

/** A finite number in a range; the fault says what is allowed. −0 is read as 0. */
function number(range: Range = {}) {
  const allowed = allowedOf(range);
  const { min = -Infinity, max = Infinity, above = false, integer = false } = range;
  const within = (value: number) =>
    (above ? value > min : value >= min) && value <= max && (!integer || Number.isInteger(value));
  return z
    .number({ error: allowed })
    .refine(within, allowed)
    .overwrite((value) => (value === 0 ? 0 : value));
}

/**
 * Checks across fields run also where a field by itself is wrong, so that all faults come at once. They are therefore
 * given values of any kind, and look only at those that are what they should be.
 */
const ALWAYS = { when: ({ value }: { value: unknown }) => isRecord(value) };

type Context = z.core.$RefinementCtx;
const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;
const listIn = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : []);
const numberIn = (value: unknown): number | null =>
  typeof value === 'number' && Number.isFinite(value) ? value : null;

function fail(context: Context, path: (string | number)[], message: string): void {
  context.addIssue({ code: 'custom', path, message });
}

/** Calls back for each number of a list with the nearest number before it. */
function inOrder(
  values: readonly unknown[],
  visit: (value: number, before: number | null, i: number) => void,
): void {
  let before: number | null = null;
  values.forEach((item, i) => {
    const value = numberIn(item);
    if (value === null) return;
    visit(value, before, i);
    before = value;
  });
}

function checkRadii(
  rotor: { hubRadiusM: unknown; tipRadiusM: unknown; stations: unknown },
  context: Context,
): void {
  const hub = numberIn(rotor.hubRadiusM);
  const tip = numberIn(rotor.tipRadiusM);
  if (hub !== null && tip !== null && tip <= hub)
    fail(context, ['tipRadiusM'], `allowed: above the hub radius, ${hub} m`);
  const radii = listIn(rotor.stations).map((station) => (isRecord(station) ? station['radiusM'] : null));
  inOrder(radii, (radius, before, i) => {
    const path = ['stations', i, 'radiusM'];
    if (hub !== null && tip !== null && (radius < hub || radius > tip))
      fail(context, path, `allowed: from the hub radius, ${hub} m, to the tip radius, ${tip} m`);
    if (before !== null && radius <= before)
      fail(context, path, `allowed: above ${before} m, the station before`);
  });
}

function checkRows(table: { alphaDeg: unknown; cl: unknown; cd: unknown }, context: Context): void {
  const alpha = listIn(table.alphaDeg);
  for (const name of ['cl', 'cd'] as const)
    if (Array.isArray(table[name]) && table[name].length !== alpha.length)
      fail(context, [name, 'length'], `allowed: ${alpha.length} rows, as alphaDeg has`);
  inOrder(alpha, (value, before, i) => {
    if (before !== null && value <= before)
      fail(context, ['alphaDeg', i], `allowed: above ${before}, the row before`);
  });
}

function checkSpeed(point: { rotorSpeedRpm?: unknown; tipSpeedRatio?: unknown }, context: Context): void {
  if ((point.rotorSpeedRpm === undefined) === (point.tipSpeedRatio === undefined))
    fail(context, ['rotorSpeedRpm'], 'allowed: either rotorSpeedRpm or tipSpeedRatio, one of the two');
}

function checkPolarNames(given: { rotor: unknown; polars: unknown }, context: Context): void {
  if (!isRecord(given.polars) || !isRecord(given.rotor)) return;
  const { polars } = given;
  const names = Object.keys(polars).join(', ') || 'none given';
  listIn(given.rotor['stations']).forEach((station, i) => {
    const name = isRecord(station) ? station['polar'] : null;
    if (typeof name === 'string' && !Object.hasOwn(polars, name))
      fail(context, ['rotor', 'stations', i, 'polar'], `allowed: one of the polars (${names})`);
  });
}

const flag = z.boolean({ error: 'allowed: true or false' });

const station = z.strictObject({
  radiusM: number({ min: 0, above: true, unit: 'm' }),
  chordM: number({ min: 0, unit: 'm' }),
  twistDeg: number({ min: -360, max: 360, unit: '°' }),
  polar: z.string({ error: 'allowed: the name of one of the polars' }),
});

const rotor = z
  .strictObject(
    {
      bladeCount: number({ min: 1, max: 100, integer: true }),
      hubRadiusM: number({ min: 0, above: true, unit: 'm' }),
      tipRadiusM: number({ min: 0, above: true, unit: 'm' }),
      stations: z
        .array(station, { error: 'allowed: a list of at least 1 station' })
        .min(1, 'allowed: at least 1 station'),
    },
    { error: objectOr('bladeCount, hubRadiusM, tipRadiusM and stations') },
  )
  .superRefine(checkRadii, ALWAYS);

function objectOr(fields: string) {
  // Unknown keys have a message of their own; this one is for a value that is no object.
  return (issue: { code?: string }) =>
    issue.code === 'invalid_type' ? `allowed: an object with ${fields}` : undefined;
}

const column = (range: Range) =>
  z.array(number(range), { error: 'allowed: a list of numbers' }).min(2, 'allowed: at least 2 rows');

/** Linear in α and periodic; α ascends within [−180°, 180°]. */
const polar = z
  .strictObject(
    { alphaDeg: column({ min: -180, max: 180, unit: '°' }), cl: column({}), cd: column({}) },
    { error: objectOr('alphaDeg, cl and cd') },
  )
  .superRefine(checkRows, ALWAYS);

const point = z
  .strictObject(
    {
      windSpeedMS: number({ min: 0, above: true, unit: 'm/s' }),
      rotorSpeedRpm: number({ min: 0, unit: 'rpm' }).optional(),
      tipSpeedRatio: number({ min: 0 }).optional(),
      pitchDeg: number({ min: -360, max: 360, unit: '°' }),
    },
    { error: objectOr('windSpeedMS, pitchDeg and rotorSpeedRpm or tipSpeedRatio') },
  )
  .superRefine(checkSpeed, ALWAYS);

const air = z.strictObject(
  {
    densityKgM3: number({ min: 0, above: true, unit: 'kg/m³' }).optional(),
    viscosityPaS: number({ min: 0, above: true, unit: 'Pa·s' }).optional(),
  },
  { error: objectOr('densityKgM3 and viscosityPaS') },
);

const options = z.strictObject(
  {
    tipLoss: flag.default(true),
    hubLoss: flag.default(true),
    dragInInduction: flag.default(true),
    highInduction: z
      .enum(['buhl', 'glauert', 'straight-tangent'], { error: 'allowed: buhl, glauert, straight-tangent' })
      .default('buhl'),
    /** Whether each point lists its sections. */
    sections: flag.default(true),
  },
  { error: objectOr('tipLoss, hubLoss, dragInInduction, highInduction, sections') },
);

/**
 * A case for the solver as a script writes it: rotor, polars, operating points, options. Without `air`, or for what it
 * leaves out, the standard atmosphere at sea level is taken; without `options` all corrections are on.
 */
export const solverCase = z
  .strictObject(
    {
      rotor,
      polars: z.record(z.string(), polar, { error: 'allowed: an object of polars by name' }),
      air: air.default({}),
      points: z
        .array(point, { error: 'allowed: a list of at least 1 point' })
        .min(1, 'allowed: at least 1 point'),
      options: options.prefault({}),
    },
    { error: objectOr('rotor, polars and points') },
  )
  .superRefine(checkPolarNames, ALWAYS);
export type SolverCase = z.infer<typeof solverCase>;
