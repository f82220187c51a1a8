import { expect, it } from 'vitest';
import { slimOperations } from '../../build/slim-operations.ts';

it('takes out what the browser never reads and leaves the rest of an operation alone', () => {
  const slim = slimOperations(`import { z } from 'zod';
const response = z.string();
export const saveDraft = operation({
  id: 'drafts.save-draft',
  path: '/drafts/:draftId',
  params: z.object({ draftId: z.uuid() }),
  query: null,
  body: z.strictObject({ response: z.string(), params: z.null() }),
  response,
});`);
  expect(slim).toContain('params: true,\n  query: null,');
  expect(slim).toContain('body: z.strictObject({ response: z.string(), params: z.null() })');
  expect(slim).toContain('response: true,\n})');
  expect(slim).toContain("path: '/drafts/:draftId'");
});
