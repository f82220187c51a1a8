import { describe, expect, it } from 'vitest';
import {
  betzPlanform,
  betzSection,
  compilePolar,
  compileRotor,
  retwist,
  schmitzPlanform,
  schmitzSection,
  sizeBlade,
  solvePoint,
} from '../index.ts';

const INPUT = {
  bladeCount: 3,
  hubRadiusM: 1,
  tipRadiusM: 25,
  tipSpeedRatio: 7.5,
  designLift: 1.05,
  designAlphaDeg: 6,
  maxChordM: 1.9,
  stationCount: 40,
};

describe('sizeBlade', () => {
  const { stations } = sizeBlade(INPUT);
  it('stands from just outside the hub to the tip, ascending', () => {
    const radii = stations.map((s) => s.radiusM);
    expect(radii).toHaveLength(40);
    expect(radii[0]).toBeGreaterThan(1);
    expect(radii.at(-1)).toBeCloseTo(25, 10);
    expect(radii).toEqual(radii.toSorted((a, b) => a - b));
  });
  it('keeps chord and twist below their caps, with one maximum of chord and twist falling outward', () => {
    const chords = stations.map((s) => s.chordM);
    expect(Math.max(...chords)).toBeLessThanOrEqual(1.9);
    const top = chords.indexOf(Math.max(...chords));
    expect(chords.slice(0, top + 1)).toEqual(chords.slice(0, top + 1).toSorted((a, b) => a - b));
    expect(chords.slice(top)).toEqual(chords.slice(top).toSorted((a, b) => b - a));
    const twists = stations.map((s) => s.twistDeg);
    expect(twists).toEqual(twists.toSorted((a, b) => b - a));
    expect(Math.max(...twists)).toBeLessThanOrEqual(20);
  });
  it('is the optimum planform over the working span', () => {
    for (const s of stations.filter(({ radiusM }) => radiusM > 0.5 * 25 && radiusM < 0.95 * 25)) {
      const best = schmitzSection({ ...INPUT, lift: 1.05 }, s.radiusM);
      expect(Math.abs(s.chordM / best.chordM - 1)).toBeLessThan(1e-3);
      expect(s.twistDeg).toBeCloseTo((best.phi * 180) / Math.PI - 6, 4);
    }
  });
  it('takes a lift that changes along the span', () => {
    const graded = sizeBlade({ ...INPUT, designLift: (share) => (share > 0.6 ? 0.7 : 1.05) });
    const at = (list: typeof stations, i: number) => list[i]?.chordM ?? NaN;
    expect(at(graded.stations, 33) / at(stations, 33)).toBeCloseTo(1.5, 3);
    expect(at(graded.stations, 20)).toBe(at(stations, 20));
  });
  it.each([
    ['designLift', { designLift: 0 }],
    ['hubRadiusM', { hubRadiusM: 30 }],
    ['stationCount', { stationCount: 2 }],
    ['maxChordM', { maxChordM: -1 }],
    ['tipSpeedRatio', { tipSpeedRatio: NaN }],
  ])('refuses a wrong %s', (field, wrong) => {
    expect(() => sizeBlade({ ...INPUT, ...wrong })).toThrow(expect.objectContaining({ field }));
  });
});

describe('planforms over radii', () => {
  it('are their sections one by one', () => {
    const input = { ...INPUT, lift: 1 };
    const betz = betzPlanform(input, [5, 20]);
    const schmitz = schmitzPlanform(input, [5, 20]);
    expect(betz.chordM[1]).toBe(betzSection(input, 20).chordM);
    expect(schmitz.inflowRad[0]).toBe(schmitzSection(input, 5).phi);
    expect(() => betzPlanform(input, [5, 26])).toThrow('radii[1]');
  });
});

describe('retwist', () => {
  const alphaDeg = Array.from({ length: 181 }, (_, i) => -180 + 2 * i);
  const RAD = Math.PI / 180;
  const polar = compilePolar({
    alphaDeg,
    cl: alphaDeg.map((a) => 2.8 * Math.sin(2 * (a + 3) * RAD)),
    cd: alphaDeg.map((a) => 0.008 + 1.3 * Math.sin(a * RAD) ** 2),
  });
  const stations = sizeBlade(INPUT).stations.slice(0, -1);
  const cp = (twists: ArrayLike<number>) =>
    solvePoint(
      compileRotor({
        ...INPUT,
        stations: stations.map((s, i) => ({ ...s, twistDeg: twists[i] ?? NaN, polar })),
      }),
      { windSpeedMS: 10, rotorSpeedRadS: 3, pitchDeg: 1.5 },
    ).cp ?? NaN;
  it('leaves no element that gains from any other twist', () => {
    const start = stations.map((s) => s.twistDeg);
    const rotor = compileRotor({ ...INPUT, stations: stations.map((s) => ({ ...s, polar })) });
    const { twistDeg } = retwist(rotor, { tipSpeedRatio: 7.5, pitchDeg: 1.5 });
    const best = cp(twistDeg);
    expect(best).toBeGreaterThan(cp(start));
    for (let i = 0; i < stations.length; i += 3)
      for (const change of [-4, -0.5, 0.5, 4])
        expect(cp(twistDeg.map((t, k) => (k === i ? t + change : t)))).toBeLessThanOrEqual(best + 1e-12);
  });
});
