export type CsvCell = string | number | null;

/** Text that a spreadsheet would run as a formula is made plain by a leading apostrophe. */
function cellText(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  const safe = /^[=+\-@\t\r]/u.test(cell) ? `'${cell}` : cell;
  return /[",\n\r]/u.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Rows as CSV (RFC 4180), numbers with a decimal point. */
export function csvOf(header: readonly string[], rows: readonly (readonly CsvCell[])[]): string {
  return [header, ...rows].map((row) => row.map(cellText).join(',')).join('\r\n') + '\r\n';
}
