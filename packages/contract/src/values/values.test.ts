import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { faultsOf, fieldName, shownValue } from './fault.ts';
import { quantity } from './quantity.ts';
import { emailAddress, nameText, newPassword } from './text.ts';

const chord = quantity({ label: 'Chord', unit: 'm', min: 0, max: 20, above: true });

describe('quantity', () => {
  it.each([
    ['infinity, as 1e999 reads in JSON', JSON.parse('1e999') as number],
    ['NaN', NaN],
    ['text', '1,5'],
    ['nothing', undefined],
    ['null', null],
    ['zero where the minimum is refused', 0],
    ['minus zero where the minimum is refused', -0],
    ['above the maximum', 20.001],
  ])('refuses %s and names label, unit and range', (_, value) => {
    const result = chord.safeParse(value);
    expect(result.success).toBe(false);
    expect(result.error?.issues[0]?.message).toMatch(/^Chord .*allowed: a number above 0 and at most 20 m$/u);
  });

  it('reads −0 as 0', () => {
    const parsed = quantity({ label: 'Twist', unit: '°', min: -45, max: 90 }).parse(-0);
    expect(Object.is(parsed, 0)).toBe(true);
  });

  it('keeps every number within its range as it is', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 20, noNaN: true }), (value) => {
        expect(chord.parse(value)).toBe(value);
      }),
    );
  });
});

describe('names', () => {
  const name = nameText('Design name');
  it.each([
    'O’Brien "quoted" <b>',
    'Blatt 🌬️ nº 7',
    'ריש־רוח مروحة',
    "'; DROP TABLE designs; --",
    '=SUM(A1)',
  ])('keeps %s', (text) => {
    expect(name.parse(text)).toBe(text);
  });
  it('refuses 10,000 characters and says how many are allowed', () => {
    expect(name.safeParse('x'.repeat(10_000)).error?.issues[0]?.message).toBe(
      'Design name is too long; allowed: text of 1 to 120 characters without control characters',
    );
  });
  it.each(['', '   ', 'a\u0000b', 'two\nlines', 'over\u202eride'])('refuses %j', (text) => {
    expect(name.safeParse(text).success).toBe(false);
  });
});

describe('passwords and addresses', () => {
  it('holds passwords to what bcrypt reads: 12 characters to 72 bytes', () => {
    expect(newPassword.safeParse('short').success).toBe(false);
    expect(newPassword.safeParse('ü'.repeat(37)).success).toBe(false);
    expect(newPassword.safeParse('a'.repeat(72)).success).toBe(true);
  });
  it('folds the case of an address', () => {
    expect(emailAddress.parse(' Ines@Example.ORG ')).toBe('ines@example.org');
    expect(emailAddress.safeParse('nobody').success).toBe(false);
  });
});

describe('faults', () => {
  it('names every fault at once with field, value and what is allowed', () => {
    const schema = z.strictObject({ stations: z.array(z.strictObject({ chordM: chord })) });
    const input = { stations: [{ chordM: -1 }, { chordM: 'x', extra: 1 }] };
    const result = schema.safeParse(input);
    expect(result.success).toBe(false);
    const faults = result.error === undefined ? [] : faultsOf(result.error, input);
    expect(faults.map((fault) => [fault.field, fault.value])).toEqual([
      ['stations[0].chordM', '-1'],
      ['stations[1].chordM', '"x"'],
      ['stations[1].extra', '1'],
    ]);
  });
  it('never echoes a password', () => {
    const schema = z.object({ password: newPassword });
    const result = schema.safeParse({ password: 'hunter2' });
    expect(
      JSON.stringify(faultsOf(result.error ?? new z.ZodError([]), { password: 'hunter2' })),
    ).not.toContain('hunter2');
  });
  it('shortens long values', () => {
    expect(shownValue('y'.repeat(10_000)).length).toBeLessThan(90);
    expect(fieldName(['stations', 3, 'radiusM'])).toBe('stations[3].radiusM');
  });
});
