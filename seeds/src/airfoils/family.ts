import type { AirfoilInput } from '@tipward/contract';
import { camberedOutline, circleOutline } from './outline.ts';
import { cylinderPolar, inventedPolar } from './polar-formula.ts';

/** Reynolds numbers of the set: the small rotor lives near the lower ones, the large near the upper. */
const REYNOLDS = [4e5, 1.5e6, 1.2e7];

const MEMBERS = [
  { name: 'SM-18', thicknessPct: 18, camberShare: 0.035 },
  { name: 'SM-21', thicknessPct: 21, camberShare: 0.035 },
  { name: 'SM-25', thicknessPct: 25, camberShare: 0.032 },
  { name: 'SM-30', thicknessPct: 30, camberShare: 0.028 },
  { name: 'SM-40', thicknessPct: 40, camberShare: 0.02 },
];

/** The invented SM family with its root cylinder. */
export function smFamily(): AirfoilInput[] {
  const members = MEMBERS.map((member): AirfoilInput => ({
    name: member.name,
    thicknessPct: member.thicknessPct,
    note: 'SM family, invented for the demo. Shape by a published thickness form on a parabolic camber line.',
    outline: camberedOutline(member.thicknessPct, member.camberShare),
    polars: (['clean', 'soiled'] as const).flatMap((state) =>
      REYNOLDS.map((reynolds) => inventedPolar(member, reynolds, state)),
    ),
  }));
  const cylinder: AirfoilInput = {
    name: 'SM-root',
    thicknessPct: 100,
    note: 'Root cylinder of the SM family, invented for the demo.',
    outline: circleOutline(),
    polars: [cylinderPolar(1e6)],
  };
  return [...members, cylinder];
}
