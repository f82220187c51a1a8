import { airfoilInput, faultsOf } from '@tipward/contract';
import type { AirfoilInput, Fault } from '@tipward/contract';

export type AirfoilFile =
  | { readonly airfoil: AirfoilInput; readonly faults: readonly [] }
  | { readonly airfoil: null; readonly faults: readonly Fault[] };

/** An airfoil from JSON text, held to the contract: all faults at once, with place, value and what is allowed. */
export function readAirfoilFile(text: string): AirfoilFile {
  let given: unknown;
  try {
    given = JSON.parse(text);
  } catch (error) {
    const message = `is not JSON (${error instanceof Error ? error.message : 'unreadable'}); allowed: one JSON object`;
    return { airfoil: null, faults: [{ field: 'file', value: text.slice(0, 40), message }] };
  }
  const parsed = airfoilInput.safeParse(given);
  return parsed.success
    ? { airfoil: parsed.data, faults: [] }
    : { airfoil: null, faults: faultsOf(parsed.error, given) };
}
