import { z } from 'zod';

export interface QuantityRule {
  readonly label: string;
  /** SI or trade unit, empty for a pure number. */
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  /** The minimum itself is refused (a radius of 0 m, say). */
  readonly above?: boolean;
  readonly integer?: boolean;
}

/** What a quantity may be, in words: 'a number above 0 and at most 20 m'. */
export function allowedText(rule: QuantityRule): string {
  const kind = rule.integer === true ? 'a whole number' : 'a number';
  const low = rule.above === true ? `above ${rule.min}` : `at least ${rule.min}`;
  return `${kind} ${low} and at most ${rule.max}${rule.unit === '' ? '' : ` ${rule.unit}`}`;
}

/** A finite number with its unit and range; −0 is read as 0. Infinity (1e999) and NaN are refused. */
export function quantity(rule: QuantityRule) {
  const allowed = `allowed: ${allowedText(rule)}`;
  const within = (value: number) =>
    value <= rule.max && (rule.above === true ? value > rule.min : value >= rule.min);
  return z
    .number({ error: `${rule.label} is not a finite number; ${allowed}` })
    .refine(within, `${rule.label} is out of range; ${allowed}`)
    .refine(
      (value) => rule.integer !== true || Number.isInteger(value),
      `${rule.label} is not whole; ${allowed}`,
    )
    .overwrite((value) => (value === 0 ? 0 : value));
}
