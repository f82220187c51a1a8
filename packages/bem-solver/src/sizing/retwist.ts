import { requireNumber } from '../input-error.ts';
import { brentMaximum } from '../numerics/maximum.ts';
import type { Rotor, RotorElement } from '../rotor/rotor.ts';
import { emptyState, solveSection } from '../section/solve-section.ts';

const FROM_DEG = -15;
const TO_DEG = 50;
const COARSE_DEG = 1;

/**
 * The twist (°) of each element that gives its annulus the most power at a tip-speed ratio and pitch, chord held. Annuli
 * do not act on each other in blade-element momentum theory, so each is a search of its own: a march in 1° steps, then
 * Brent's parabolic search to 1e-4°. Elements without load (hub, tip, no chord) keep their twist.
 */
export function retwist(
  rotor: Rotor,
  { tipSpeedRatio, pitchDeg = 0 }: { tipSpeedRatio: number; pitchDeg?: number },
): { twistDeg: Float64Array } {
  requireNumber('tipSpeedRatio', tipSpeedRatio, 0, 50, true);
  requireNumber('pitchDeg', pitchDeg, -90, 90);
  return {
    twistDeg: Float64Array.from(rotor.elements, (element) =>
      bestTwist(rotor, element, tipSpeedRatio, pitchDeg),
    ),
  };
}

function bestTwist(rotor: Rotor, element: RotorElement, tipSpeedRatio: number, pitchDeg: number): number {
  const own = (element.twistRad * 180) / Math.PI;
  if (element.solidity === 0 || element.loss.tip <= 0 || element.loss.hub <= 0) return own;
  const state = emptyState();
  const drive = (twistDeg: number) => {
    solveSection(
      {
        solidity: element.solidity,
        localSpeedRatio: (tipSpeedRatio * element.radiusM) / rotor.tipRadiusM,
        pitchRad: ((twistDeg + pitchDeg) * Math.PI) / 180,
        polar: element.polar,
        loss: element.loss,
      },
      rotor.options,
      state,
    );
    return state.status === 'converged' ? state.ct * state.speedSquared : -Infinity;
  };
  let best = own;
  let most = drive(own);
  for (let twist = FROM_DEG; twist <= TO_DEG; twist += COARSE_DEG) {
    const value = drive(twist);
    if (value > most) {
      best = twist;
      most = value;
    }
  }
  if (most === -Infinity) return own;
  return brentMaximum(drive, best - COARSE_DEG, best + COARSE_DEG, 1e-4).x;
}
