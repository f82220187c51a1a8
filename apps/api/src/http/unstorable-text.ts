import { fieldName, shownValue, type Fault } from '@tipward/contract';

/** Half of a surrogate pair: with the u flag a whole pair counts as one character and does not match. */
const LONE_SURROGATE = /\p{Surrogate}/u;
const MESSAGE =
  'holds a character that is no text; allowed: text without NUL and without half of a surrogate pair';

/** Texts that PostgreSQL cannot keep (NUL) or that are no Unicode (lone surrogates), anywhere in a document. */
export function unstorableText(value: unknown, path: readonly PropertyKey[] = []): Fault[] {
  if (typeof value === 'string')
    return value.includes('\u0000') || LONE_SURROGATE.test(value)
      ? [{ field: fieldName(path), value: shownValue(value), message: MESSAGE }]
      : [];
  if (typeof value !== 'object' || value === null) return [];
  return Array.isArray(value)
    ? value.flatMap((item: unknown, i) => unstorableText(item, [...path, i]))
    : Object.entries(value).flatMap(([key, item]) => unstorableText(item, [...path, key]));
}
