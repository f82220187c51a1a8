import { readNumber } from '@tipward/design-model';

/**
 * What was typed into a number field, as the contract wants it: a number, null when empty and that is allowed, or the
 * text itself where it is no number, for the contract to refuse in its own words.
 */
export function readTyped(text: unknown, emptyIsNull: boolean): unknown {
  if (typeof text !== 'string') return text;
  if (text.trim() === '') return emptyIsNull ? null : undefined;
  return readNumber(text).value ?? text;
}
