import { performance } from 'node:perf_hooks';
import { compileRotor, refineGeometry, SOLVER, solveCurve, solvePoint } from '../src/index.ts';
import type { Rotor } from '../src/index.ts';
import { BLADE_COUNT, geometry, HUB_RADIUS, pitches, ratios, stations, TIP_RADIUS } from './bench-rotor.ts';
import { compileReference } from './c-reference.ts';

/*
 * Times the kernel: a surface of 40 stations × 60 tip-speed ratios × 40 pitches, a curve of 50 elements × 60 ratios, a single
 * point; and, with a C compiler at hand, the surface against the same method in C (-O3) in turns. Medians; the ratio is what
 * counts, as both sides meet the same machine at the same time.
 */
const ROUNDS = 15;
const WARM_UP = 5;

function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? NaN;
}

function timed(work: () => void): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}

function surface(rotor: Rotor): number {
  let sum = 0;
  for (const pitchDeg of pitches)
    for (const cp of solveCurve(rotor, { pitchDeg, tipSpeedRatios: ratios }).cp) sum += cp;
  return sum;
}

function refinedRotor(rotor: Rotor): Rotor {
  const grid = refineGeometry(
    stations.map((station) => ({ ...station, thicknessPct: 20 })),
    HUB_RADIUS,
    TIP_RADIUS,
    50,
  );
  const refined = Array.from(grid.radiusM, (radiusM, i) => {
    const element = rotor.elements[grid.stationIndex[i] ?? 0];
    if (element === undefined) throw new Error(`no station for element ${i}`);
    return {
      radiusM,
      chordM: grid.chordM[i] ?? NaN,
      twistDeg: grid.twistDeg[i] ?? NaN,
      polar: element.polar,
    };
  });
  return compileRotor({
    bladeCount: BLADE_COUNT,
    hubRadiusM: HUB_RADIUS,
    tipRadiusM: TIP_RADIUS,
    stations: refined,
  });
}

const line = (what: string, value: string) => console.log(`${what.padEnd(52)} ${value.padStart(14)}`);

const rotor = compileRotor(geometry());
const fine = refinedRotor(rotor);
console.log(`${SOLVER.name} ${SOLVER.version}, Node.js ${process.version}; medians of ${ROUNDS} rounds`);
line(
  'first curve, cold',
  `${timed(() => solveCurve(fine, { pitchDeg: 0, tipSpeedRatios: ratios })).toFixed(1)} ms`,
);

const reference = compileReference(rotor, ratios, pitches);
const own: number[] = [];
const other: number[] = [];
let [checksum, otherChecksum] = [NaN, NaN];
for (let round = -WARM_UP; round < ROUNDS; round += 1) {
  const ms = timed(() => (checksum = surface(rotor)));
  if (round < 0) continue;
  own.push(ms);
  // The first surface of each process is left out: it fills the caches.
  const last = reference?.run(6).at(-1);
  if (last === undefined) continue;
  other.push(last.milliseconds);
  otherChecksum = last.checksum;
}
reference?.remove();

const sections = rotor.elements.length * ratios.length * pitches.length;
line(`surface, ${sections.toLocaleString('en-GB')} sections`, `${median(own).toFixed(1)} ms`);
line('  per section', `${((1e6 * median(own)) / sections).toFixed(0)} ns`);
if (reference === null) console.log('no C compiler (cc) found: the comparison with C is left out');
else {
  line('  the same method in C (-O3)', `${median(other).toFixed(1)} ms`);
  line('  ratio to C', (median(own) / median(other)).toFixed(2));
  line('  sums of CP differ by', Math.abs(checksum / otherChecksum - 1).toExponential(1));
}
const curves = Array.from({ length: 101 }, () =>
  timed(() => solveCurve(fine, { pitchDeg: 0, tipSpeedRatios: ratios })),
);
line('curve, 50 elements × 60 ratios', `${median(curves).toFixed(2)} ms`);
const points = Array.from({ length: 401 }, (_, i) =>
  timed(() => solvePoint(fine, { windSpeedMS: 10, rotorSpeedRadS: 1 + i / 1000, pitchDeg: 1 })),
);
line('single point, 50 elements', `${median(points).toFixed(3)} ms`);
