/** Keys of the studio, for the list under '?'. */
export const STUDIO_KEYS: readonly (readonly [keys: string, does: string])[] = [
  ['↑ ↓ ← →', 'Move through the station table, or a plot’s cursor'],
  ['Shift arrows', 'Select a range in the table; ten steps of a plot’s cursor'],
  ['Enter or F2', 'Edit the cell; Enter again keeps it and goes down'],
  ['Tab, Shift Tab', 'Keep the cell and go to the next or the one before'],
  ['Esc', 'Take the edit of the cell back; Esc, then Tab leaves the table'],
  ['Ctrl C, Ctrl V', 'Copy with headers, paste a block from a spreadsheet'],
  ['Ctrl D', 'Fill the range with its top row'],
  ['Ctrl A', 'Select the whole table'],
  ['Delete', 'Empty the cells'],
  ['Insert', 'Insert a station below, half way to the next'],
  ['Shift Delete', 'Delete the selected stations'],
  ['Ctrl Z, Ctrl Y', 'Undo, redo'],
  ['Ctrl S', 'Save the draft now'],
  ['Home, End', 'First and last column of the row (with Ctrl: first and last cell); ends of a plot’s cursor'],
];
