import type { DesignContent, Draft, Evaluation, Version } from '@tipward/contract';
import { evaluateContent, getDraft, getVersion } from '@tipward/contract';
import { checkDraft } from '@tipward/design-model';
import { queryOptions, useQueries } from '@tanstack/react-query';
import { callApi } from '../../../lib/api/call-api.ts';
import type { Selection } from '../lib/selection.ts';

/** One of the compared: a version with its evaluation of record, or an own draft evaluated as it stands. */
export interface ComparedItem {
  readonly id: string;
  readonly label: string;
  readonly title: string;
  readonly link: string;
  readonly programmeId: string;
  readonly content: DesignContent;
  readonly evaluation: Evaluation;
}

function ofVersion(version: Version): ComparedItem {
  return {
    id: version.id,
    label: version.label,
    title: `${version.designName} ${version.label}: ${version.note}`,
    link: `/versions/${version.id}`,
    programmeId: version.programmeId,
    content: version.content,
    evaluation: version.evaluation,
  };
}

async function ofDraft(draft: Draft, signal: AbortSignal): Promise<ComparedItem> {
  const { content, faults } = checkDraft(draft.content);
  if (content === null)
    throw new Error(
      `The draft does not hold yet: ${faults.map((fault) => `${fault.field} ${fault.message}`).join('; ')}`,
    );
  const evaluation = await callApi(evaluateContent, {
    params: { programmeId: draft.programmeId },
    body: { content },
    signal,
  });
  return {
    id: draft.id,
    label: 'draft',
    title: `${draft.designName}, draft${draft.parentLabel === null ? '' : ` from ${draft.parentLabel}`}`,
    link: `/drafts/${draft.id}`,
    programmeId: draft.programmeId,
    content,
    evaluation,
  };
}

function itemQuery({ kind, id }: Selection['items'][number]) {
  return queryOptions({
    queryKey: ['compare', kind, id],
    queryFn: async ({ signal }) =>
      kind === 'version'
        ? ofVersion(await callApi(getVersion, { params: { versionId: id }, signal }))
        : ofDraft(await callApi(getDraft, { params: { draftId: id }, signal }), signal),
  });
}

export const useComparedItems = (selection: Selection) =>
  useQueries({ queries: selection.items.map(itemQuery) });
