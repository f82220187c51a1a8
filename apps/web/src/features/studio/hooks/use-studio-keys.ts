import { useEffect } from 'react';

interface StudioKeyActions {
  readonly undo: () => void;
  readonly redo: () => void;
  readonly save: () => void;
}

const isField = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('input, textarea, select, [role="dialog"]') !== null;

/** Undo, redo and save by key wherever the focus is; fields keep the undo of their own text. */
export function useStudioKeys({ undo, redo, save }: StudioKeyActions): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      const act =
        key === 's'
          ? save
          : key === 'y' || (key === 'z' && event.shiftKey)
            ? redo
            : key === 'z'
              ? undo
              : null;
      if (act === null || (act !== save && isField(event.target))) return;
      event.preventDefault();
      act();
    };
    window.addEventListener('keydown', onKey);
    return () => {
      window.removeEventListener('keydown', onKey);
    };
  }, [undo, redo, save]);
}
