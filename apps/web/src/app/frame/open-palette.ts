export const PALETTE_EVENT = 'tipward:open-palette';

/** Asks the frame to open the command palette. */
export function openPalette(): void {
  window.dispatchEvent(new Event(PALETTE_EVENT));
}
