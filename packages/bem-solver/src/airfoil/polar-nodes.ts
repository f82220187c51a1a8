import type { PolarColumns } from './polar.ts';

/**
 * Angles at which the solver tabulates a section's balance, over one turn: the rows of the polar, thinned where they stand
 * very close and filled up where they stand far apart, each with the values there and the slopes to its left and right.
 */
export interface PolarNodes {
  readonly alpha: Float64Array;
  readonly sine: Float64Array;
  readonly cosine: Float64Array;
  readonly cl: Float64Array;
  readonly cd: Float64Array;
  readonly clSlopeBefore: Float64Array;
  readonly clSlopeAfter: Float64Array;
  readonly cdSlopeBefore: Float64Array;
  readonly cdSlopeAfter: Float64Array;
}

const RAD = Math.PI / 180;
const LEAST_GAP = 0.7 * RAD;
const LARGEST_GAP = 3 * RAD;

interface Node {
  readonly alpha: number;
  readonly cl: number;
  readonly cd: number;
  clBefore: number;
  readonly clAfter: number;
  cdBefore: number;
  readonly cdAfter: number;
}

/** Value and slope of a column within a cell at the share t of its width. */
function within(
  y: Float64Array,
  slopes: Float64Array | null,
  cell: number,
  width: number,
  t: number,
): readonly [number, number] {
  const y0 = y[cell] as number;
  const rise = (y[cell + 1] as number) - y0;
  if (slopes === null) return [y0 + t * rise, rise / width];
  const m0 = width * (slopes[cell] as number);
  const m1 = width * (slopes[cell + 1] as number);
  const square = 3 * rise - 2 * m0 - m1;
  const cube = m0 + m1 - 2 * rise;
  return [y0 + t * (m0 + t * (square + t * cube)), (m0 + t * (2 * square + 3 * t * cube)) / width];
}

/** A row where lift turns: there the solution may double back, so that it is never thinned out. */
function turns(cl: Float64Array, row: number): boolean {
  const before = (cl[row] ?? 0) - (cl[row - 1] ?? cl[row] ?? 0);
  const after = (cl[row + 1] ?? cl[row] ?? 0) - (cl[row] ?? 0);
  return before * after <= 0;
}

/** @param first the cell that begins at the first row of the turn */
export function polarNodes(columns: PolarColumns, first: number): PolarNodes {
  const { alpha, cl, cd, clSlope, cdSlope } = columns;
  const nodes: Node[] = [];
  for (let cell = first; cell < alpha.length - 1; cell += 1) {
    const x0 = alpha[cell] as number;
    const width = (alpha[cell + 1] as number) - x0;
    const parts = Math.ceil(width / LARGEST_GAP - 1e-9);
    const previous = nodes.at(-1);
    if (previous !== undefined && x0 - previous.alpha < LEAST_GAP && !turns(cl, cell)) continue;
    for (let part = 0; part < parts; part += 1) {
      const t = part / parts;
      const [lift, clAfter] = within(cl, clSlope, cell, width, t);
      const [drag, cdAfter] = within(cd, cdSlope, cell, width, t);
      const clBefore = part === 0 && cell > first ? endSlope(cl, clSlope, alpha, cell - 1) : clAfter;
      const cdBefore = part === 0 && cell > first ? endSlope(cd, cdSlope, alpha, cell - 1) : cdAfter;
      nodes.push({ alpha: x0 + t * width, cl: lift, cd: drag, clBefore, clAfter, cdBefore, cdAfter });
    }
  }
  const seam = nodes[0];
  if (seam !== undefined) {
    seam.clBefore = endSlope(cl, clSlope, alpha, alpha.length - 2);
    seam.cdBefore = endSlope(cd, cdSlope, alpha, alpha.length - 2);
  }
  const column = (pick: (node: Node) => number) => Float64Array.from(nodes, pick);
  return {
    alpha: column((node) => node.alpha),
    sine: column((node) => Math.sin(node.alpha)),
    cosine: column((node) => Math.cos(node.alpha)),
    cl: column((node) => node.cl),
    cd: column((node) => node.cd),
    clSlopeBefore: column((node) => node.clBefore),
    clSlopeAfter: column((node) => node.clAfter),
    cdSlopeBefore: column((node) => node.cdBefore),
    cdSlopeAfter: column((node) => node.cdAfter),
  };
}

function endSlope(y: Float64Array, slopes: Float64Array | null, alpha: Float64Array, cell: number): number {
  return within(y, slopes, cell, (alpha[cell + 1] as number) - (alpha[cell] as number), 1)[1];
}
