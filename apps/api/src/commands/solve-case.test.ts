import { solverResult, type SolverResult } from '@tipward/contract';
import { describe, expect, it } from 'vitest';
import { airfoilInput } from '../../test/factories.ts';
import { CaseError, readCase, solveCase } from './solve-case.ts';

const [{ alphaDeg, cl, cd } = { alphaDeg: [], cl: [], cd: [] }] = airfoilInput('Foil').polars;
const station = (radiusM: number) => ({ radiusM, chordM: 0.4, twistDeg: 12 - radiusM, polar: 'p0' });
const goodCase = () => ({
  rotor: { bladeCount: 3, hubRadiusM: 0.5, tipRadiusM: 8, stations: [1, 3, 5, 7].map(station) },
  polars: { p0: { alphaDeg, cl, cd } },
  points: [
    { windSpeedMS: 8, rotorSpeedRpm: 60, pitchDeg: 0 },
    { windSpeedMS: 8, tipSpeedRatio: 6.5, pitchDeg: -0 },
  ] as object[],
});
const solve = (given: object): SolverResult =>
  solverResult.parse(JSON.parse([...solveCase(readCase(JSON.stringify(given)))].join('')));
function faultsOf(given: unknown): string[] {
  try {
    readCase(typeof given === 'string' ? given : JSON.stringify(given));
  } catch (error) {
    if (error instanceof CaseError)
      return error.message
        .split('\n')
        .slice(1)
        .map((line) => line.slice(4));
    throw error;
  }
  return [];
}

describe('a good case', () => {
  it('is solved, with what was given given back to the last digit', () => {
    const { solver, points } = solve(goodCase());
    expect(solver.name).not.toBe('');
    expect(points.map(({ status }) => status)).toEqual(['converged', 'converged']);
    expect(points[0]).toMatchObject({ windSpeedMS: 8, rotorSpeedRpm: 60, pitchDeg: 0 });
    expect(points[0]?.tipSpeedRatio).toBeCloseTo((2 * Math.PI * 8) / 8, 12);
    expect(points[1]).toMatchObject({ tipSpeedRatio: 6.5, pitchDeg: 0 });
    expect(points[1]?.sections?.map(({ radiusM }) => radiusM)).toEqual([1, 3, 5, 7]);
    const { cp = null, cq = null } = points[1] ?? {};
    expect(cp).toBeGreaterThan(0);
    expect(cp).toBeLessThan(16 / 27);
    expect(cp).toBeCloseTo((cq ?? 0) * 6.5, 12);
  });

  it('leaves the sections out when told to, with the same totals', () => {
    const withSections = solve(goodCase());
    const without = solve({ ...goodCase(), options: { sections: false } });
    expect(without.points).toEqual(withSections.points.map(({ sections: _sections, ...totals }) => totals));
  });

  it('takes the options and the air', () => {
    const cp = (options: object) => solve({ ...goodCase(), options }).points[1]?.cp ?? null;
    expect(cp({ tipLoss: false, hubLoss: false })).toBeGreaterThan(cp({}) ?? Infinity);
    const dense = solve({ ...goodCase(), air: { densityKgM3: 2.45 } }).points[0]?.powerW ?? 0;
    expect(dense / (solve(goodCase()).points[0]?.powerW ?? 1)).toBeCloseTo(2, 12);
  });

  it.each([1, 200])('may have %i stations', (count) => {
    const stations = Array.from({ length: count }, (_, i) => station(0.6 + (7 * i) / count));
    const { points } = solve({ ...goodCase(), rotor: { ...goodCase().rotor, stations } });
    expect(points[0]?.sections).toHaveLength(count);
  });

  it('has no load on the hub and tip radius', () => {
    const stations = [0.5, 3, 8].map(station);
    const { points } = solve({ ...goodCase(), rotor: { ...goodCase().rotor, stations } });
    for (const i of [0, 2])
      expect(points[0]?.sections?.[i]).toMatchObject({ lossFactor: 0, normalForceNM: 0 });
  });

  it('comes point by point', () => {
    const points = Array.from({ length: 5000 }, (_, i) => ({
      windSpeedMS: 8,
      tipSpeedRatio: 2 + i / 1000,
      pitchDeg: 0,
    }));
    const pieces = solveCase(readCase(JSON.stringify({ ...goodCase(), points })));
    pieces.next();
    const first: unknown = JSON.parse(String(pieces.next().value));
    expect(first).toMatchObject({ tipSpeedRatio: 2 });
    expect([...pieces]).toHaveLength(5000);
  });

  it('gives the same number for a point whatever stands beside it', () => {
    const both = solve(goodCase()).points;
    const alone = solve({ ...goodCase(), points: goodCase().points.slice(1) }).points;
    expect(alone[0]).toEqual(both[1]);
  });
});

describe('a case that is wrong', () => {
  it('is told everything at once', () => {
    const { rotor, points } = goodCase();
    const faults = faultsOf({
      rotor: {
        ...rotor,
        bladeCount: 2.5,
        stations: [
          { ...station(3), chordM: '1,5' },
          station(3),
          station(2),
          { ...station(9), polar: 'none' },
        ],
      },
      polars: { p0: { alphaDeg: [0, 5, 5], cl: [0, 1], cd: [0, 0, null] } },
      points: [
        ...points,
        { windSpeedMS: 0, pitchDeg: 0 },
        { windSpeedMS: 1, pitchDeg: 0, tipSpeedRatio: 1, rotorSpeedRpm: 1 },
      ],
      options: { tiploss: true, highInduction: 'own' },
    });
    expect(faults.toSorted()).toEqual(
      [
        'rotor.bladeCount is 2.5; allowed: a whole number at least 1 and at most 100',
        'rotor.stations[0].chordM is "1,5"; allowed: a finite number at least 0 m',
        'rotor.stations[1].radiusM is 3; allowed: above 3 m, the station before',
        'rotor.stations[2].radiusM is 2; allowed: above 3 m, the station before',
        'rotor.stations[3].radiusM is 9; allowed: from the hub radius, 0.5 m, to the tip radius, 8 m',
        'rotor.stations[3].polar is "none"; allowed: one of the polars (p0)',
        'polars.p0.alphaDeg[2] is 5; allowed: above 5, the row before',
        'polars.p0.cl.length is 2; allowed: 3 rows, as alphaDeg has',
        'polars.p0.cd[2] is null; allowed: a finite number',
        'points[2].windSpeedMS is 0; allowed: a finite number above 0 m/s',
        'points[2].rotorSpeedRpm is missing; allowed: either rotorSpeedRpm or tipSpeedRatio, one of the two',
        'points[3].rotorSpeedRpm is 1; allowed: either rotorSpeedRpm or tipSpeedRatio, one of the two',
        'options.tiploss is not a field of a case',
        'options.highInduction is "own"; allowed: buhl, glauert, straight-tangent',
      ].toSorted(),
    );
  });

  it.each(['1e999', '-1e999', '"1"', 'null', '[]', '{}', 'true'])('windSpeedMS %s is refused', (value) => {
    const text = JSON.stringify(goodCase()).replace('"windSpeedMS":8', `"windSpeedMS":${value}`);
    expect(faultsOf(text)).toHaveLength(1);
    expect(faultsOf(text)[0]).toMatch(
      /^points\[0\]\.windSpeedMS is .*; allowed: a finite number above 0 m\/s$/u,
    );
  });

  it.each(['NaN', '1,5', 'Infinity', '.5', '1.'])('%s is no JSON, and its place is named', (value) => {
    const text = JSON.stringify(goodCase(), null, 1).replace('"pitchDeg": 0', `"pitchDeg": ${value}`);
    expect(faultsOf(text)).toHaveLength(1);
    expect(faultsOf(text)[0]).toMatch(/^not JSON: line \d+, column \d+: /u);
  });

  it.each(['', 'null', '[]', '5', '{}'])('%j is no case', (text) => {
    expect(faultsOf(text).length).toBeGreaterThan(0);
  });

  it('takes no name from the prototype for a polar', () => {
    const text = JSON.stringify(goodCase()).replaceAll('"polar":"p0"', '"polar":"toString"');
    expect(faultsOf(text)[0]).toContain('rotor.stations[0].polar is "toString"');
  });
});
