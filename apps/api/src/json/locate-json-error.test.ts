import { describe, expect, it } from 'vitest';
import { locateJsonError } from './locate-json-error.ts';

describe('text that is JSON', () => {
  it.each([
    '{}',
    '[]',
    ' [1, -0.5e+3, "a\\u00e9\\n", true, false, null, {"a": [{}]}] ',
    '"😀"',
    '0',
    '1e999',
    '{"a":{}}',
  ])('%s', (text) => {
    JSON.parse(text);
    expect(locateJsonError(text)).toBeNull();
  });
});

describe('text that is not', () => {
  it.each([
    ['', 1, 1, 'the text ends where a value should stand'],
    ['{"a": NaN}', 1, 7, '"NaN" stands where a value should stand'],
    ['{\n  "a": 1,5\n}', 2, 10, '"5" stands where a field name in double quotes should stand'],
    ['{"a": 1,}', 1, 9, '"}" stands where a field name in double quotes should stand'],
    ['[1, 2', 1, 6, 'the text ends where "," or "]" should stand'],
    ['[1,\n 2,\n]', 3, 1, '"]" stands where a value should stand'],
    ["{'a': 1}", 1, 2, `"'a'" stands where a field name in double quotes should stand`],
    ['{"a" 1}', 1, 6, '"1" stands where ":" should stand'],
    ['[01]', 1, 3, '"1" stands where "," or "]" should stand'],
    ['{} {}', 1, 4, '"{" stands where the end should stand'],
    ['["a\tb"]', 1, 2, null],
    ['[+1]', 1, 2, '"+1" stands where a value should stand'],
    ['[Infinity]', 1, 2, '"Infinity" stands where a value should stand'],
  ])('%j', (text, line, column, message) => {
    expect(() => JSON.parse(text) as unknown).toThrow(SyntaxError);
    const found = locateJsonError(text);
    expect(found).toMatchObject({ line, column });
    if (message !== null) expect(found?.message).toBe(message);
  });
});

it('agrees with JSON.parse on texts cut off or altered at every place', () => {
  const whole = '{"rotor": {"x": [1.5, -2e-3, "\\"q\\\\", true]}, "n": null}';
  for (let i = 0; i < whole.length; i += 1)
    for (const text of [
      whole.slice(0, i),
      `${whole.slice(0, i)}?${whole.slice(i + 1)}`,
      `${whole.slice(0, i)}${whole.slice(i + 1)}`,
    ]) {
      let valid = true;
      try {
        JSON.parse(text);
      } catch {
        valid = false;
      }
      expect(locateJsonError(text) === null, text).toBe(valid);
    }
});

it('does not run out of stack on deep nesting', () => {
  expect(locateJsonError('['.repeat(200_000))?.column).toBe(200_001);
});
