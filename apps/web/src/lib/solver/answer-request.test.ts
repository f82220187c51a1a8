import { DEFAULT_SETTINGS } from '@tipward/contract';
import type { DesignContent } from '@tipward/contract';
import type { LiveResult } from '@tipward/design-model';
import { describe, expect, it } from 'vitest';
import { createAnswerer } from './answer-request.ts';
import type { SolverContext } from './protocol.ts';

const alphaDeg = Array.from({ length: 73 }, (_, i) => -180 + 5 * i);
const radians = (degrees: number) => (degrees * Math.PI) / 180;
/** An invented section: lift 2 sin 2α, drag like a plate's. */
const plate = {
  name: 'plate',
  thicknessPct: 18,
  polarSetHash: 'a'.repeat(64),
  outline: [
    [1, 0],
    [0.5, 0.09],
    [0, 0],
    [0.5, -0.09],
    [1, 0],
  ] as const,
  polars: [
    {
      reynolds: 1e6,
      surfaceState: 'clean' as const,
      source: 'invented for this test',
      alphaDeg,
      cl: alphaDeg.map((alpha) => 2 * Math.sin(radians(2 * alpha))),
      cd: alphaDeg.map((alpha) => 0.01 + 1.2 * Math.sin(radians(alpha)) ** 2),
      measuredFromDeg: null,
      measuredToDeg: null,
    },
  ],
};
const context: SolverContext = {
  specificationHash: 'b'.repeat(64),
  requirements: [],
  airfoils: [plate],
  specification: {
    ratedPowerKW: 40,
    bladeCount: 3,
    tipRadiusM: 7.8,
    hubRadiusM: 0.45,
    coneDeg: 0,
    control: 'variable-speed-pitch',
    minRotorSpeedRpm: 20,
    maxRotorSpeedRpm: 80,
    maxTipSpeedMS: 68,
    minPitchDeg: 0,
    maxPitchDeg: 90,
    drivetrainEfficiency: 0.9,
    airDensityKgM3: 1.225,
    airViscosityPaS: 1.81e-5,
    windClass: 'III',
    meanWindSpeedMS: 7.5,
    weibullShape: 2,
    cutInMS: 3,
    cutOutMS: 25,
    designTipSpeedRatio: 7,
    thrustLimitKN: null,
    lossesPct: 5,
  },
};
const content: DesignContent = {
  schema: 1,
  specificationIssue: 1,
  pitchDeg: 0,
  designTipSpeedRatio: 7,
  settings: { ...DEFAULT_SETTINGS, elements: 20 },
  airfoils: [{ name: 'plate', airfoilId: '', polarSetHash: plate.polarSetHash }],
  stations: [
    { radiusM: 0.6, chordM: 0.7, twistDeg: 16, thicknessPct: 18, airfoil: null },
    { radiusM: 4, chordM: 0.5, twistDeg: 4, thicknessPct: 18, airfoil: null },
    { radiusM: 7.8, chordM: 0.2, twistDeg: 0, thicknessPct: 18, airfoil: null },
  ],
};

describe('the solver worker', () => {
  it('solves a content under its context at the tip-speed ratio asked for', () => {
    const answer = createAnswerer();
    answer({ serial: 1, call: 'setContext', input: { key: 'k', context } });
    const reply = answer({ serial: 2, call: 'solveLive', input: { key: 'k', content, tipSpeedRatio: 6 } });
    expect(reply).toMatchObject({ serial: 2, ok: true });
    const live = (reply as unknown as { output: LiveResult }).output;
    expect(live.span.tipSpeedRatio).toBe(6);
    expect(live.maxCp).toBeGreaterThan(0.2);
    expect(live.maxCp).toBeLessThan(16 / 27);
  });
  it('keeps contexts apart and marks evaluations of drafts as unsaved', () => {
    const answer = createAnswerer();
    answer({ serial: 1, call: 'setContext', input: { key: 'k', context } });
    const reply = answer({ serial: 2, call: 'evaluate', input: { key: 'k', content } });
    expect(reply).toMatchObject({ ok: true, output: { contentHash: 'unsaved', verdicts: [] } });
    expect(answer({ serial: 3, call: 'evaluate', input: { key: 'other', content } })).toEqual({
      serial: 3,
      ok: false,
      message: "The solver knows no context 'other'",
    });
  });
  it('answers a content it cannot solve with the reason, and goes on', () => {
    const answer = createAnswerer();
    answer({ serial: 1, call: 'setContext', input: { key: 'k', context: { ...context, airfoils: [] } } });
    const refused = answer({
      serial: 2,
      call: 'solveLive',
      input: { key: 'k', content, tipSpeedRatio: null },
    });
    expect(refused).toMatchObject({ serial: 2, ok: false });
    answer({ serial: 3, call: 'setContext', input: { key: 'k', context } });
    expect(answer({ serial: 4, call: 'warmUp', input: { key: 'k', content } })).toMatchObject({ ok: true });
  });
});
