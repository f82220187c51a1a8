import type { ProgrammeSummary, ReviewSummary } from '@tipward/contract';
import { expect, it } from 'vitest';
import { waitingFor } from './waiting.ts';

const programmes = [
  { id: 'p1', role: 'lead' },
  { id: 'p2', role: 'aerodynamicist' },
] as ProgrammeSummary[];

function review(
  id: string,
  programmeId: string,
  author: string,
  state: ReviewSummary['state'],
  askedAt: string,
) {
  const versionState = {
    open: 'in-review',
    approved: 'approved',
    'changes-requested': 'changes-requested',
    withdrawn: 'withdrawn',
  }[state];
  return {
    id,
    programmeId,
    programmeName: programmeId,
    state,
    askedAt,
    askedBy: { id: author, name: author },
    version: {
      id: `v-${id}`,
      designName: 'Blade',
      label: 'v1',
      state: versionState,
      author: { id: author, name: author },
    },
  } as ReviewSummary;
}

it('gives a lead what others wait for, an author what came back, oldest first, and never one’s own to sign', () => {
  const items = waitingFor('me', programmes, [
    review('a', 'p1', 'other', 'open', '2025-03-02'),
    review('b', 'p1', 'me', 'open', '2025-03-01'),
    review('c', 'p2', 'other', 'open', '2025-03-01'),
    review('d', 'p1', 'other', 'approved', '2025-03-01'),
    review('e', 'p2', 'me', 'changes-requested', '2025-03-03'),
    review('f', 'p1', 'other', 'changes-requested', '2025-03-03'),
    review('g', 'p1', 'other', 'withdrawn', '2025-03-03'),
  ]);
  expect(items.map(({ key, to }) => [key, to])).toEqual([
    ['d', '/versions/v-d'],
    ['a', '/reviews/a'],
    ['e', '/reviews/e'],
  ]);
});
