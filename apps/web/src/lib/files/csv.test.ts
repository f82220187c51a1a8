import { expect, it } from 'vitest';
import { csvOf } from './csv.ts';

it('quotes what must be quoted, keeps numbers exact, and disarms formulas', () => {
  const text = csvOf(
    ['name', 'cp'],
    [
      ['a "b", c', 0.1 + 0.2],
      ['=1+1', -0.5],
      ['two\nlines', null],
    ],
  );
  expect(text).toBe('name,cp\r\n"a ""b"", c",0.30000000000000004\r\n\'=1+1,-0.5\r\n"two\nlines",\r\n');
});
