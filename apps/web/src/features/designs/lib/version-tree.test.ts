import type { VersionSummary } from '@tipward/contract';
import { expect, it } from 'vitest';
import { layOutTree } from './version-tree.ts';

const version = (number: number, parent: number | null) =>
  ({
    id: `id${String(number)}`,
    number,
    parentId: parent === null ? null : `id${String(parent)}`,
  }) as VersionSummary;

it('keeps the first child in its parent’s lane and gives branches their own', () => {
  const nodes = layOutTree([version(4, 2), version(3, 2), version(2, 1), version(1, null), version(5, 3)]);
  expect(nodes.map(({ version: { number }, column, lane }) => [number, column, lane])).toEqual([
    [1, 0, 0],
    [2, 1, 0],
    [3, 2, 0],
    [4, 3, 1],
    [5, 4, 0],
  ]);
  expect(nodes[3]?.parent?.version.number).toBe(2);
});

it('begins a lane where the parent is not of this design', () => {
  expect(layOutTree([version(1, 9), version(2, null)]).map(({ lane, parent }) => [lane, parent])).toEqual([
    [0, null],
    [1, null],
  ]);
});
