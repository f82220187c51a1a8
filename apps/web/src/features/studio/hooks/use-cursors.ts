import { useEffect, useState, useSyncExternalStore } from 'react';
import { useSearchParams } from 'react-router-dom';
import { CursorStore, cursorsOf, withCursors } from '../lib/cursor-store.ts';
import type { Cursors } from '../lib/cursor-store.ts';

const URL_QUIET_MS = 300;

/** The studio's cursors; they start from the link and are written into it once they rest. */
export function useCursorStore(): CursorStore {
  const [query, setQuery] = useSearchParams();
  const [store] = useState(() => new CursorStore(cursorsOf(query)));
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const unsubscribe = store.subscribe(() => {
      clearTimeout(timer);
      timer = setTimeout(() => {
        setQuery((before) => withCursors(before, store.get()), { replace: true, preventScrollReset: true });
      }, URL_QUIET_MS);
    });
    return () => {
      clearTimeout(timer);
      unsubscribe();
    };
  }, [store, setQuery]);
  return store;
}

/** A part of the cursors; the caller is drawn again only when that part changes. */
export function useCursor<T extends string | number | boolean | null>(
  store: CursorStore,
  pick: (cursors: Cursors) => T,
): T {
  return useSyncExternalStore(store.subscribe, () => pick(store.get()));
}
