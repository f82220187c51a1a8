export interface KeyHelp {
  readonly keys: readonly string[];
  readonly does: string;
}

/** Keys of the studio, for the list under '?'. */
export const STUDIO_KEYS: readonly KeyHelp[] = [
  { keys: ['↑', '↓', '←', '→'], does: 'Move through the station table, or a plot’s cursor' },
  { keys: ['Shift + arrows'], does: 'Select a range in the table; ten steps of a plot’s cursor' },
  { keys: ['Enter', 'F2'], does: 'Edit the cell; Enter again keeps it and goes down' },
  { keys: ['Tab', 'Shift + Tab'], does: 'Keep the cell and go to the next or the one before' },
  { keys: ['Esc'], does: 'Take the edit of the cell back; Esc, then Tab leaves the table' },
  { keys: ['Ctrl + C', 'Ctrl + V'], does: 'Copy with headers, paste a block from a spreadsheet' },
  { keys: ['Ctrl + D'], does: 'Fill the range with its top row' },
  { keys: ['Ctrl + A'], does: 'Select the whole table' },
  { keys: ['Delete'], does: 'Empty the cells' },
  { keys: ['Insert'], does: 'Insert a station below, half way to the next' },
  { keys: ['Shift + Delete'], does: 'Delete the selected stations' },
  { keys: ['Ctrl + Z', 'Ctrl + Y'], does: 'Undo, redo' },
  { keys: ['Ctrl + S'], does: 'Save the draft now' },
  {
    keys: ['Home', 'End'],
    does: 'First and last column of the row (with Ctrl: first and last cell); ends of a plot’s cursor',
  },
];
