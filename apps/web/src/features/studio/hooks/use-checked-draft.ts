import type { DesignContent, DraftContent, Fault } from '@tipward/contract';
import { checkDraft } from '@tipward/design-model';
import { useMemo, useState } from 'react';

export interface CheckedDraft {
  /** The draft as the solver takes it; null while it has faults. */
  readonly content: DesignContent | null;
  readonly faults: readonly Fault[];
  /** The latest content without faults, for what must show something; null before there was one. */
  readonly lastValid: DesignContent | null;
}

/** Holds the draft against what a version must be, at every edit. */
export function useCheckedDraft(draft: DraftContent): CheckedDraft {
  const checked = useMemo(() => checkDraft(draft), [draft]);
  const [lastValid, setLastValid] = useState(checked.content);
  if (checked.content !== null && checked.content !== lastValid) setLastValid(checked.content);
  return { ...checked, lastValid: checked.content ?? lastValid };
}
