import { retwist, sizeBlade } from '@tipward/bem-solver';
import type { DesignContent, Specification, Station } from '@tipward/contract';
import type { AirfoilData } from '../airfoil-data.ts';
import { prepareRotor } from '../evaluation/rotor-input.ts';
import { THICKEST_LIFTING_PCT } from '../evaluation/stall-margin.ts';

export interface SizingInput {
  readonly specification: Specification;
  readonly airfoils: readonly AirfoilData[];
  readonly tipSpeedRatio: number;
  readonly designLift: number;
  readonly maxChordM: number | null;
  readonly stationCount: number;
}

/** Relative thickness along the span: round at the root, the thinnest airfoil outboard. Common practice; a start to edit. */
function startThickness(share: number, thinnest: number, thickest: number): number {
  const knots: readonly (readonly [number, number])[] = [
    [0.06, thickest],
    [0.2, Math.min(thickest, Math.max(thinnest, 40))],
    [0.35, Math.min(thickest, Math.max(thinnest, 28))],
    [0.6, Math.min(thickest, Math.max(thinnest, 22))],
    [0.85, thinnest],
  ];
  const above = knots.findIndex(([at]) => share <= at);
  if (above === 0) return thickest;
  const right = knots[above];
  const left = knots[above - 1];
  if (right === undefined || left === undefined) return thinnest;
  return left[1] + ((share - left[0]) / (right[0] - left[0])) * (right[1] - left[1]);
}

/** α at which the thinnest airfoil's clean polar of the middle Reynolds number gives the design lift (degrees). */
function alphaAtLift(foil: AirfoilData, designLift: number): number {
  const clean = foil.polars
    .filter((p) => p.surfaceState === 'clean')
    .toSorted((a, b) => a.reynolds - b.reynolds);
  const table = clean[Math.floor(clean.length / 2)] ?? foil.polars[0];
  if (table === undefined) throw new RangeError(`${foil.name} has no polar; allowed: 1 to 40`);
  for (let i = 1; i < table.alphaDeg.length; i += 1) {
    const [a0, a1, l0, l1] = [
      table.alphaDeg[i - 1] ?? 0,
      table.alphaDeg[i] ?? 0,
      table.cl[i - 1] ?? 0,
      table.cl[i] ?? 0,
    ];
    if (a0 >= -10 && a1 <= 25 && l0 <= designLift && l1 > designLift)
      return a0 + ((designLift - l0) / (l1 - l0)) * (a1 - a0);
  }
  throw new RangeError(
    `designLift ${designLift} is not reached by ${foil.name}; allowed: up to ${Math.max(...table.cl).toFixed(2)}`,
  );
}

const rounded = (value: number, digits: number) => Number(value.toFixed(digits));

/**
 * A first blade from the specification: the optimum planform with wake rotation (Schmitz), chord capped, root blended
 * to a round section, numbers rounded to what a drawing holds. Throws RangeError when the lift cannot be reached.
 */
export function sizeFromSpecification(input: SizingInput): { stations: Station[]; pitchDeg: number } {
  const { specification: spec, airfoils, maxChordM } = input;
  const sorted = airfoils.toSorted((a, b) => a.thicknessPct - b.thicknessPct);
  const thinnest = sorted[0];
  const thickest = sorted.at(-1);
  if (thinnest === undefined || thickest === undefined)
    throw new RangeError('airfoils is empty; allowed: 1 to 24');
  const blade = sizeBlade({
    bladeCount: spec.bladeCount,
    hubRadiusM: spec.hubRadiusM,
    tipRadiusM: spec.tipRadiusM,
    tipSpeedRatio: input.tipSpeedRatio,
    designLift: input.designLift,
    designAlphaDeg: alphaAtLift(thinnest, input.designLift),
    ...(maxChordM === null ? {} : { maxChordM }),
    stationCount: input.stationCount,
  });
  const stations = blade.stations.map((s): Station => ({
    radiusM: rounded(s.radiusM, 3),
    chordM: rounded(s.chordM, 3),
    twistDeg: rounded(s.twistDeg, 2),
    thicknessPct: rounded(
      startThickness(s.radiusM / spec.tipRadiusM, thinnest.thicknessPct, thickest.thicknessPct),
      1,
    ),
    airfoil: null,
  }));
  return { stations, pitchDeg: 0 };
}

/** Outward of this share the loss factor leaves the twist of an annulus no meaning of its own. */
const LAST_SHARE = 0.92;

/**
 * The same blade with the twist that gives each annulus the most power at the design tip-speed ratio and pitch; annuli
 * are independent in blade-element momentum theory. Root sections thicker than 45 % keep their twist; outward of 0.92 R
 * the twist runs on in a straight line.
 */
export function retwistContent({
  content,
  specification,
  airfoils,
}: {
  content: DesignContent;
  specification: Specification;
  airfoils: readonly AirfoilData[];
}): DesignContent {
  const prepared = prepareRotor(content, specification, airfoils);
  const best = retwist(prepared.rotor, {
    tipSpeedRatio: content.designTipSpeedRatio,
    pitchDeg: content.pitchDeg,
  });
  const radii = prepared.elements.map((element) => element.radiusM);
  const last = LAST_SHARE * specification.tipRadiusM;
  const before = 0.9 * last;
  const [atLast, atBefore] = [twistAt(radii, best.twistDeg, last), twistAt(radii, best.twistDeg, before)];
  const slope = (atLast - atBefore) / (last - before);
  const stations = content.stations.map((station) => {
    if (station.thicknessPct > THICKEST_LIFTING_PCT) return station;
    const { radiusM } = station;
    const twist = radiusM > last ? atLast + slope * (radiusM - last) : twistAt(radii, best.twistDeg, radiusM);
    return { ...station, twistDeg: rounded(twist, 2) };
  });
  return { ...content, stations };
}

function twistAt(radii: readonly number[], twists: ArrayLike<number>, radiusM: number): number {
  const above = radii.findIndex((r) => r >= radiusM);
  if (above === -1) return twists[radii.length - 1] ?? 0;
  const right = radii[above] ?? radiusM;
  const left = radii[above - 1];
  const t1 = twists[above] ?? 0;
  if (left === undefined || right === left) return t1;
  const t0 = twists[above - 1] ?? t1;
  return t0 + ((radiusM - left) / (right - left)) * (t1 - t0);
}
