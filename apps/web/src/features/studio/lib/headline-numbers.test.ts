import type { Evaluation, KeyNumbers } from '@tipward/contract';
import type { LiveResult } from '@tipward/design-model';
import { describe, expect, it } from 'vitest';
import { headlineNumbers } from './headline-numbers.ts';
import { verdictRows } from './verdict-rows.ts';

const live = { maxCp: 0.48, tipSpeedRatioAtMaxCp: 7.1, ctAtMaxCp: null } as LiveResult;
const evaluation = {
  keyNumbers: { energyNetMWh: 151.25, maxThrustKN: 9.5 } as KeyNumbers,
  schedule: [{ windSpeedMS: 11, tipSpeedRatio: 5.7 }],
  verdicts: [
    {
      kind: 'min-cp',
      bound: 'lower',
      limit: 0.45,
      value: 0.48,
      margin: 0.03,
      verdict: 'holds',
      at: { quantity: 'tip-speed-ratio', value: 7.1 },
    },
    {
      kind: 'max-thrust',
      bound: 'upper',
      limit: 9,
      value: 9.5,
      margin: -0.5,
      verdict: 'fails',
      at: { quantity: 'wind-speed', value: 11 },
    },
  ],
} as unknown as Evaluation;
const reference = { maxCp: 0.5, energyNetMWh: 150, maxThrustKN: 10 } as KeyNumbers;

describe('headlineNumbers', () => {
  const rows = headlineNumbers({
    live: { output: live, current: true },
    evaluation: { output: evaluation, current: false },
    reference,
  });
  const row = (id: string) => rows.find((each) => each.id === id);
  it('takes curve numbers from the live solve and the rest from the evaluation, each with its own currency', () => {
    expect(row('maxCp')).toMatchObject({
      value: '0.4800',
      difference: '−0.0200',
      share: '−4.00 %',
      current: true,
    });
    expect(row('energyNetMWh')).toMatchObject({
      value: '151.3',
      difference: '+1.3',
      share: '+0.83 %',
      current: false,
    });
  });
  it('shows a dash where either side is unknown', () => {
    expect(row('ctAtMaxCp')).toMatchObject({ value: '–', difference: '–', share: '' });
    expect(row('tipSpeedRatioAtMaxCp')).toMatchObject({ value: '7.10', difference: '–' });
  });
});

describe('verdictRows', () => {
  it('puts what fails first and finds where it can be looked at', () => {
    expect(
      verdictRows(evaluation).map(({ verdict, limit, margin, place }) => [
        verdict.kind,
        limit,
        margin,
        place,
      ]),
    ).toEqual([
      [
        'max-thrust',
        '≤\u20099.00',
        '−0.50',
        { kind: 'tip-speed-ratio', tipSpeedRatio: 5.7, text: '11.00 m/s' },
      ],
      ['min-cp', '≥\u20090.4500', '+0.0300', { kind: 'tip-speed-ratio', tipSpeedRatio: 7.1, text: 'λ 7.10' }],
    ]);
  });
});
