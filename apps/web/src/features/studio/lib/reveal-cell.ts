/** Edges of a scrolled table that are covered: by its head, and by its first column (px). */
const COVERED = { top: 29, left: 70 } as const;

/**
 * Scrolls a table's own frame, and nothing around it, so that a cell stands clear of the head and the first column.
 * (The browser's scrollIntoView would move the page as well.)
 */
export function revealCell(frame: HTMLElement, cell: HTMLElement): void {
  const box = frame.getBoundingClientRect();
  const at = cell.getBoundingClientRect();
  const above = box.top + COVERED.top - at.top;
  const below = at.bottom - (box.top + frame.clientHeight);
  if (above > 0) frame.scrollTop -= above;
  else if (below > 0) frame.scrollTop += below;
  if (cell.dataset['column'] === '0') return;
  const before = box.left + COVERED.left - at.left;
  const after = at.right - (box.left + frame.clientWidth);
  if (before > 0) frame.scrollLeft -= before;
  else if (after > 0) frame.scrollLeft += after;
}
