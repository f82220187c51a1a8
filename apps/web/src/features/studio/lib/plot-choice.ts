import { SPAN_QUANTITIES } from './span-quantities.ts';

const KEY = 'tipward-studio-plots';
const DEFAULT: readonly string[] = ['alpha', 'induction'];

/** Which two spanwise plots were chosen last on this machine. */
export function readPlotChoice(): readonly string[] {
  try {
    const held: unknown = JSON.parse(localStorage.getItem(KEY) ?? 'null');
    if (!Array.isArray(held) || held.length !== DEFAULT.length) return DEFAULT;
    return held.every((id) => SPAN_QUANTITIES.some((quantity) => quantity.id === id))
      ? (held as string[])
      : DEFAULT;
  } catch {
    return DEFAULT;
  }
}

export function writePlotChoice(choice: readonly string[]): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(choice));
  } catch {
    // Storage shut off: the choice lasts as long as the page.
  }
}
