const PLAIN = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/iu;
const DECIMAL_COMMA = /^[+-]?\d+,\d+$/u;

/**
 * A cell as a number. Text with a decimal comma is refused with a hint rather than guessed at: '1,5' may be 1.5 or two
 * numbers. The typographic minus is read as a minus.
 */
export function readNumber(cell: number | string): { value: number | null; fault: string | null } {
  if (typeof cell === 'number') {
    return Number.isFinite(cell)
      ? { value: cell === 0 ? 0 : cell, fault: null }
      : refuse('is not a finite number; allowed: a number');
  }
  const text = cell.trim().replace(/^[\u2212\u2013]/u, '-');
  if (text === '') return refuse('is empty; allowed: a number');
  if (DECIMAL_COMMA.test(text))
    return refuse(`has a decimal comma; allowed: a number with a point, such as ${text.replace(',', '.')}`);
  if (!PLAIN.test(text)) return refuse('is not a number; allowed: a number with a point, such as 1.5');
  const value = Number(text);
  if (!Number.isFinite(value)) return refuse('is too large; allowed: a finite number');
  return { value: value === 0 ? 0 : value, fault: null };
}

function refuse(fault: string) {
  return { value: null, fault };
}
