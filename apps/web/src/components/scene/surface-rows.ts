import type { BladeSurface } from '@tipward/design-model';

/** Where a radius lies between the rows of a lofted surface: row below, and the share of the way to the next. */
export function rowAt(surface: BladeSurface, radiusM: number): { row: number; share: number } | null {
  const { positions, rows, columns } = surface;
  const radiusOf = (row: number) => positions[row * columns * 3] ?? NaN;
  if (rows < 2 || !(radiusM >= radiusOf(0) && radiusM <= radiusOf(rows - 1))) return null;
  let low = 0;
  let high = rows - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (radiusOf(middle) <= radiusM) low = middle;
    else high = middle;
  }
  const gap = radiusOf(high) - radiusOf(low);
  return { row: low, share: gap > 0 ? (radiusM - radiusOf(low)) / gap : 0 };
}

/** Writes the section of the surface at a radius into `target` (x, y, z each). False where the blade has none. */
export function writeSection(surface: BladeSurface, radiusM: number, target: Float32Array): boolean {
  const at = rowAt(surface, radiusM);
  if (at === null) return false;
  const stride = surface.columns * 3;
  const below = at.row * stride;
  for (let i = 0; i < stride; i += 1) {
    const a = surface.positions[below + i] ?? 0;
    const b = surface.positions[below + stride + i] ?? a;
    target[i] = a + at.share * (b - a);
  }
  return true;
}

/** Triangles of a surface of `rows` by `columns` points. */
export function surfaceIndex(rows: number, columns: number): Uint32Array {
  const index = new Uint32Array((rows - 1) * (columns - 1) * 6);
  let at = 0;
  for (let row = 0; row < rows - 1; row += 1)
    for (let column = 0; column < columns - 1; column += 1) {
      const a = row * columns + column;
      const b = a + columns;
      index.set([a, b, a + 1, a + 1, b, b + 1], at);
      at += 6;
    }
  return index;
}

/** Leading and trailing edge as drawn seen from the suction side: highest and lowest y of each row. */
export function planformEdges(surface: BladeSurface): {
  radiusM: number;
  leadingM: number;
  trailingM: number;
}[] {
  return Array.from({ length: surface.rows }, (_, row) => {
    let leadingM = -Infinity;
    let trailingM = Infinity;
    for (let column = 0; column < surface.columns; column += 1) {
      const y = surface.positions[(row * surface.columns + column) * 3 + 1] ?? 0;
      leadingM = Math.max(leadingM, y);
      trailingM = Math.min(trailingM, y);
    }
    return { radiusM: surface.positions[row * surface.columns * 3] ?? 0, leadingM, trailingM };
  });
}
