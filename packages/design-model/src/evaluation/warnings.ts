import type { DesignContent, Evaluation, SpanPoint, Specification, Warning } from '@tipward/contract';
import { chordRoughnessPct, twistRoughnessDeg } from './roughness.ts';
import { THICKEST_LIFTING_PCT } from './stall-margin.ts';
import type { ElementInfo, PreparedRotor } from './rotor-input.ts';

/** Speed of sound at 15 °C, ISO 2533 standard atmosphere (m/s). */
const SOUND_MS = 340.294;
const HIGH_INDUCTION_SHARE = 0.1;

const percentR = (radiusM: number, spec: Specification) => `r/R ${(radiusM / spec.tipRadiusM).toFixed(2)}`;

/** First and last radius of the elements that a test picks, in words; null when none is. */
function stretch(
  points: readonly SpanPoint[],
  elements: readonly ElementInfo[],
  spec: Specification,
  test: (point: SpanPoint, element: ElementInfo) => boolean,
) {
  const hit = points.filter((point, i) => {
    const element = elements[i];
    return element !== undefined && test(point, element);
  });
  const first = hit[0];
  const last = hit.at(-1);
  if (first === undefined || last === undefined) return null;
  return {
    count: hit.length,
    text:
      first === last
        ? `at ${percentR(first.radiusM, spec)}`
        : `between ${percentR(first.radiusM, spec)} and ${percentR(last.radiusM, spec)}`,
    first,
  };
}

function geometryWarnings(content: DesignContent, spec: Specification): Warning[] {
  const found: Warning[] = [];
  const add = (code: string, message: string, station: number | null = null) =>
    found.push({ code, message, station });
  content.stations.forEach((s, i) => {
    if (s.radiusM < spec.hubRadiusM - 1e-9 || s.radiusM > spec.tipRadiusM + 1e-9)
      add(
        'radius-outside',
        `Radius ${s.radiusM} m lies outside the blade, ${spec.hubRadiusM} to ${spec.tipRadiusM} m`,
        i,
      );
    if (s.chordM > spec.tipRadiusM / 2)
      add('chord-units', `Chord ${s.chordM} m is over half the radius: given in mm?`, i);
  });
  const root = content.stations[0];
  const tip = content.stations.at(-1);
  if (root !== undefined && tip !== undefined) {
    if (root.twistDeg < tip.twistDeg)
      add('twist-sign', 'Twist is lower at the root than at the tip: sign turned about?');
    const largest = Math.max(...content.stations.map((s) => Math.abs(s.twistDeg)));
    if (largest > 0 && largest < 0.8 && content.stations.length > 2)
      add('twist-units', `No twist is above ${largest}°: given in rad?`);
  }
  const chord = chordRoughnessPct(content.stations, spec.tipRadiusM);
  const twist = twistRoughnessDeg(content.stations);
  if (chord.value > 1.5) add('chord-rough', 'Chord is not smooth here (second difference)', chord.station);
  if (twist.value > 4) add('twist-rough', 'Twist is not smooth here (second difference)', twist.station);
  return found;
}

/** Share of the span, by length, on which a test holds; elements are unevenly spaced. */
function shareOfSpan(points: readonly SpanPoint[], test: (point: SpanPoint) => boolean): number {
  let held = 0;
  let whole = 0;
  points.forEach((point, i) => {
    const width = (points[i + 1]?.radiusM ?? point.radiusM) - (points[i - 1]?.radiusM ?? point.radiusM);
    whole += width;
    if (test(point)) held += width;
  });
  return whole === 0 ? 0 : held / whole;
}

function nearestStation(content: DesignContent, radiusM: number): number {
  return content.stations.reduce(
    (best, s, i) =>
      Math.abs(s.radiusM - radiusM) < Math.abs((content.stations[best]?.radiusM ?? Infinity) - radiusM)
        ? i
        : best,
    0,
  );
}

/** Warnings a result carries: geometry that looks wrong, and solutions outside the range of the method or of its polars. */
export function collectWarnings(
  content: DesignContent,
  spec: Specification,
  prepared: PreparedRotor,
  span: Evaluation['span'],
): Warning[] {
  const found = geometryWarnings(content, spec);
  const { points } = span;
  const where = (test: (point: SpanPoint, element: ElementInfo) => boolean) =>
    stretch(points, prepared.elements, spec, test);
  const add = (code: string, hit: ReturnType<typeof where>, message: (text: string) => string) => {
    if (hit !== null)
      found.push({ code, message: message(hit.text), station: nearestStation(content, hit.first.radiusM) });
  };
  const lambda = `at λ ${span.tipSpeedRatio.toFixed(2)}`;
  add(
    'not-converged',
    where((p) => p.status !== 'converged'),
    (at) => `No solution ${at} ${lambda}`,
  );
  add(
    'alpha-outside',
    where(
      (p, e) =>
        e.thicknessPct <= THICKEST_LIFTING_PCT &&
        p.alphaDeg !== null &&
        (p.alphaDeg < e.measuredFromDeg || p.alphaDeg > e.measuredToDeg),
    ),
    (at) => `α lies in the extended range of the polars ${at} ${lambda}`,
  );
  add(
    'past-stall',
    where(
      (p, e) => e.thicknessPct <= THICKEST_LIFTING_PCT && p.stallMarginDeg !== null && p.stallMarginDeg < 0,
    ),
    (at) => `Past stall ${at} ${lambda}`,
  );
  add(
    'reynolds-outside',
    where((_, e) => e.thicknessPct <= THICKEST_LIFTING_PCT && e.reynoldsOutside),
    (at) => `Reynolds number outside the polars ${at}`,
  );
  add(
    'mach',
    where((p) => p.relativeSpeedMS !== null && p.relativeSpeedMS > 0.3 * SOUND_MS),
    (at) => `Mach number above 0.3 ${at}: polars are incompressible`,
  );
  const loaded = where((p) => p.axialInduction !== null && p.axialInduction > 0.4);
  const share = shareOfSpan(points, (p) => p.axialInduction !== null && p.axialInduction > 0.4);
  if (share > HIGH_INDUCTION_SHARE)
    add(
      'high-induction',
      loaded,
      (at) => `Axial induction above 0.4 on ${Math.round(100 * share)} % of the span, ${at} ${lambda}`,
    );
  for (const foil of content.airfoils) {
    if (content.settings.surfaceState === 'soiled' && prepared.missingSoiled.includes(foil.name))
      found.push({
        code: 'no-soiled-polar',
        message: `${foil.name} has no soiled polars; its clean ones are used`,
        station: null,
      });
  }
  return found;
}
