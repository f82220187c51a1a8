import type { Draft, DraftContent } from '@tipward/contract';
import { useCallback, useEffect, useRef, useState, useSyncExternalStore } from 'react';
import { storeDraft } from '../api/save-draft.ts';
import { Autosaver } from '../lib/autosaver.ts';
import type { SaveState } from '../lib/autosaver.ts';
import { KeptEdits, browserStorage } from '../lib/kept-edits.ts';
import type { KeptEdit } from '../lib/kept-edits.ts';

export interface Autosave {
  readonly state: SaveState;
  readonly saver: Autosaver;
  readonly kept: KeptEdits;
  /** An edit of an earlier visit that never reached the server; null when there is none. */
  readonly leftOver: KeptEdit | null;
  readonly dropLeftOver: () => void;
  /** Names a content as stored already, so that taking it up is not saved again. */
  readonly markStored: (content: DraftContent) => void;
}

interface Opened {
  readonly saver: Autosaver;
  readonly kept: KeptEdits;
  readonly leftOver: KeptEdit | null;
}

function openSaver(draft: Draft): Opened {
  const kept = new KeptEdits(browserStorage(), draft.id);
  const found = kept.kept();
  const leftOver =
    found !== null && JSON.stringify(found.content) !== JSON.stringify(draft.content) ? found : null;
  // From now on new edits are kept in its place, so it moves to those set aside.
  if (leftOver !== null && kept.setAside(leftOver)) kept.forget();
  const saver = new Autosaver({
    etag: `"${draft.revision}"`,
    save: (content, etag) => storeDraft(draft.id, content, etag),
    kept,
  });
  return { saver, kept, leftOver };
}

/** Saves the draft as it is edited, and again as soon as the connection is back. */
export function useAutosave(draft: Draft, content: DraftContent): Autosave {
  const [{ saver, kept, leftOver }] = useState(() => openSaver(draft));
  const [dropped, setDropped] = useState(false);
  const state = useSyncExternalStore(saver.subscribe, saver.getState);
  const stored = useRef(draft.content);
  useEffect(() => {
    if (content === stored.current) return;
    stored.current = content;
    saver.edit(content);
  }, [content, saver]);
  useEffect(() => {
    const now = () => void saver.flush();
    const hidden = () => {
      if (document.visibilityState === 'hidden') now();
    };
    window.addEventListener('online', now);
    document.addEventListener('visibilitychange', hidden);
    return () => {
      window.removeEventListener('online', now);
      document.removeEventListener('visibilitychange', hidden);
      now();
    };
  }, [saver]);
  const markStored = useCallback((held: DraftContent) => {
    stored.current = held;
  }, []);
  const dropLeftOver = useCallback(() => {
    setDropped(true);
  }, []);
  return { state, saver, kept, leftOver: dropped ? null : leftOver, dropLeftOver, markStored };
}
