import { describe, expect, it } from 'vitest';
import { compilePolar } from '../airfoil/polar.ts';
import type { Polar } from '../airfoil/polar.ts';
import { seeded } from '../numerics/seeded.ts';
import { DEFAULT_OPTIONS } from './options.ts';
import { solveSection } from './solve-section.ts';

const RAD = Math.PI / 180;

/** A polar with a random slope, zero-lift angle and stall; jumps at stall make hysteresis likely. */
function randomPolar(random: () => number): Polar {
  const [slope, zero, stall, least] = [
    4 + 4 * random(),
    -6 * random(),
    8 + 10 * random(),
    0.005 + 0.01 * random(),
  ];
  const alphaDeg = Array.from({ length: 181 }, (_, i) => -180 + 2 * i);
  const plate = (alpha: number) => 1.2 * Math.sin(2 * alpha * RAD);
  return compilePolar({
    alphaDeg,
    cl: alphaDeg.map((alpha) =>
      Math.abs(alpha) < stall ? slope * Math.sin((alpha - zero) * RAD) : plate(alpha),
    ),
    cd: alphaDeg.map((alpha) => least + 1.3 * Math.sin(alpha * RAD) ** 2),
  });
}

function randomSection(random: () => number, polar: Polar) {
  const x = 0.06 + 0.93 * random();
  return {
    solidity: 1e-4 + 0.8 * random(),
    localSpeedRatio: 0.01 * 3000 ** random(),
    pitchRad: (-20 + 80 * random()) * RAD,
    polar,
    loss: { tip: (1.5 * (1 - x)) / x, hub: (1.5 * (x - 0.05)) / 0.05 },
  };
}

describe('solveSection', () => {
  it('solves 100,000 random sections to 1e-10, or says that it does not', () => {
    const random = seeded(20260101);
    const polars = Array.from({ length: 40 }, () => randomPolar(random));
    const counts = { converged: 0, refused: 0, several: 0 };
    let worst = 0;
    for (let i = 0; i < 100_000; i += 1) {
      const polar = polars[i % polars.length];
      if (polar === undefined) throw new Error('no polar');
      const state = solveSection(randomSection(random, polar), DEFAULT_OPTIONS);
      if (state.status !== 'converged') {
        counts.refused += 1;
        continue;
      }
      counts.converged += 1;
      if (state.multipleRoots) counts.several += 1;
      worst = Math.max(worst, state.residual);
      const numbers = [state.phi, state.a, state.aPrime, state.cn, state.ct, state.speedSquared];
      if (!numbers.every(Number.isFinite)) throw new Error(`not finite: ${JSON.stringify({ ...state })}`);
    }
    console.log(
      `converged ${counts.converged}, refused ${counts.refused}, several roots ${counts.several}, worst residual ${worst.toExponential(1)}`,
    );
    expect(counts.converged + counts.refused).toBe(100_000);
    expect(counts.refused).toBeLessThan(100);
    expect(worst).toBeLessThanOrEqual(1e-10);
  });

  it('balances momentum and blade-element force in every annulus of the momentum region', () => {
    const random = seeded(7);
    const polar = randomPolar(random);
    let checked = 0;
    for (let i = 0; i < 5000; i += 1) {
      const section = randomSection(random, polar);
      const state = solveSection(section, DEFAULT_OPTIONS);
      if (state.status !== 'converged' || state.a >= 0.4 || state.phi <= 0) continue;
      checked += 1;
      const thrust = section.solidity * state.cn * state.speedSquared;
      const momentum = 4 * state.a * (1 - state.a) * state.F;
      expect(Math.abs(thrust - momentum)).toBeLessThanOrEqual(
        1e-9 * (1 + Math.abs(thrust) + 4 * Math.abs(state.a) * (1 + Math.abs(state.a))),
      );
      const torque = section.solidity * state.ct * state.speedSquared;
      const swirl = 4 * state.aPrime * (1 - state.a) * section.localSpeedRatio * state.F;
      expect(Math.abs(torque - swirl)).toBeLessThanOrEqual(1e-9 * (1 + Math.abs(torque) + Math.abs(swirl)));
    }
    expect(checked).toBeGreaterThan(1000);
  });

  it('a parked, feathered blade hardly turns (no propeller-brake root)', () => {
    const polar = compilePolar({
      alphaDeg: [-180, -10, 0, 10, 180],
      cl: [0, -1, 0, 1, 0],
      cd: [0.02, 0.01, 0.01, 0.01, 0.02],
    });
    const state = solveSection(
      { solidity: 0.05, localSpeedRatio: 1e-4, pitchRad: 85 * RAD, polar, loss: { tip: 5, hub: 5 } },
      DEFAULT_OPTIONS,
    );
    expect(state.status).toBe('converged');
    expect(state.phi).toBeGreaterThan(0);
    expect(Math.abs(state.a)).toBeLessThan(0.1);
  });

  it('a station on the tip radius carries no load, a section without chord no induction', () => {
    const polar = compilePolar({ alphaDeg: [-180, 180], cl: [1, 1], cd: [0.01, 0.01] });
    const base = { localSpeedRatio: 6, pitchRad: 0, polar };
    expect(
      solveSection({ ...base, solidity: 0.05, loss: { tip: 0, hub: 9 } }, DEFAULT_OPTIONS),
    ).toMatchObject({ status: 'no-load', F: 0, cn: 0, ct: 0 });
    const bare = solveSection({ ...base, solidity: 0, loss: { tip: 1, hub: 9 } }, DEFAULT_OPTIONS);
    expect(bare.status).toBe('converged');
    expect(bare.a).toBeCloseTo(0, 10);
    expect(bare.phi).toBeCloseTo(Math.atan(1 / 6), 10);
  });

  it('is undisturbed at standstill: λr = 0 solves, a′ alone is undefined', () => {
    const polar = compilePolar({
      alphaDeg: [-180, -90, 0, 90, 180],
      cl: [0, 0, 0, 0, 0],
      cd: [0.02, 1.2, 0.02, 1.2, 0.02],
    });
    const state = solveSection(
      { solidity: 0.05, localSpeedRatio: 0, pitchRad: 0.1, polar, loss: { tip: 5, hub: 5 } },
      DEFAULT_OPTIONS,
    );
    expect(state.status).toBe('converged');
    expect(state.aPrime).toBeNaN();
    expect(state.speedSquared).toBeGreaterThan(0);
  });
});
