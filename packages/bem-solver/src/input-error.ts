/** Misuse of a public function: which field, what stood there, what is allowed. */
export class SolverInputError extends Error {
  readonly field: string;
  readonly value: unknown;
  readonly allowed: string;

  constructor(field: string, value: unknown, allowed: string) {
    super(`${field} is ${String(value)}; allowed: ${allowed}`);
    this.name = 'SolverInputError';
    this.field = field;
    this.value = value;
    this.allowed = allowed;
  }
}

/** Returns the value when it is finite and within [min, max] (or above min), else throws SolverInputError. */
export function requireNumber(
  field: string,
  value: number,
  min: number,
  max = Infinity,
  above = false,
): number {
  const low = above ? value > min : value >= min;
  if (Number.isFinite(value) && low && value <= max) return value;
  const upper = max === Infinity ? '' : ` and at most ${max}`;
  throw new SolverInputError(field, value, `a number ${above ? 'above' : 'at least'} ${min}${upper}`);
}
