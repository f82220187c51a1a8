/** Fixed decimals of every quantity a person compares. Units stand beside the label, never in the cell. */
export const DECIMALS = {
  radiusM: 3,
  chordM: 3,
  twistDeg: 2,
  angleDeg: 2,
  thicknessPct: 1,
  cp: 4,
  ct: 4,
  lambda: 2,
  induction: 4,
  coefficient: 3,
  forceNM: 1,
  momentKNm: 2,
  thrustKN: 2,
  speedMS: 2,
  speedRpm: 2,
  percent: 2,
  factor: 3,
  areaM2: 3,
  reynolds: 0,
  powerKW: 1,
  energyMWh: 1,
} as const;
export type QuantityKind = keyof typeof DECIMALS;

const THIN_SPACE = '\u2009';
const MINUS = '\u2212';

function grouped(text: string): string {
  const [whole = '', decimals] = text.split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+(?!\d))/gu, THIN_SPACE);
  return decimals === undefined ? spaced : `${spaced}.${decimals}`;
}

/** A value with the fixed decimals of its kind; an en dash where there is none. Thousands are spaced for energy and power. */
export function formatQuantity(kind: QuantityKind, value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–';
  const fixed = Math.abs(value).toFixed(DECIMALS[kind]);
  const text = kind === 'energyMWh' || kind === 'powerKW' || kind === 'reynolds' ? grouped(fixed) : fixed;
  return value < 0 && Number(fixed) !== 0 ? MINUS + text : text;
}

/** A difference with its sign: +0.0012, −0.0012, ±0 where it vanishes at the shown decimals. */
export function formatDifference(kind: QuantityKind, difference: number | null | undefined): string {
  if (difference === null || difference === undefined || !Number.isFinite(difference)) return '–';
  if (Number(difference.toFixed(DECIMALS[kind])) === 0) return '±0';
  return difference > 0 ? `+${formatQuantity(kind, difference)}` : formatQuantity(kind, difference);
}
