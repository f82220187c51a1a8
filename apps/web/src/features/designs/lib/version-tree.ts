import type { VersionSummary } from '@tipward/contract';

export interface TreeNode {
  readonly version: VersionSummary;
  /** Place from left to right: the order in which versions were saved. */
  readonly column: number;
  /** 0 is the trunk; each branch has its own. */
  readonly lane: number;
  readonly parent: TreeNode | null;
}

/**
 * Lays versions out in time from left to right. The first child goes on in its parent's lane, a later one opens a lane
 * of its own; a version whose parent is not of this design begins one too.
 */
export function layOutTree(versions: readonly VersionSummary[]): TreeNode[] {
  const placed = new Map<string, TreeNode>();
  const continued = new Set<string>();
  let lanes = 0;
  const ordered = versions.toSorted((a, b) => a.number - b.number);
  return ordered.map((version, column) => {
    const parent = version.parentId === null ? null : (placed.get(version.parentId) ?? null);
    const goesOn = parent !== null && !continued.has(parent.version.id);
    if (parent !== null) continued.add(parent.version.id);
    const lane = goesOn ? parent.lane : lanes;
    if (!goesOn) lanes += 1;
    const node: TreeNode = { version, column, lane, parent };
    placed.set(version.id, node);
    return node;
  });
}
