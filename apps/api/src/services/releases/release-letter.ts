/** Letter of the n-th release of a programme, from 1: A … Z, AA, AB … as drawing issues are counted (common practice). */
export function releaseLetter(sequence: number): string {
  let rest = sequence;
  let letters = '';
  while (rest > 0) {
    rest -= 1;
    letters = String.fromCharCode(65 + (rest % 26)) + letters;
    rest = Math.floor(rest / 26);
  }
  return letters;
}
