import { Suspense, lazy, useEffect, useState } from 'react';
import { STUDIO_KEYS } from '../../features/studio/lib/keys.ts';
import { PALETTE_EVENT } from './open-palette.ts';

const Palette = lazy(() => import('../../features/palette/components/palette.tsx'));
const ShortcutList = lazy(() => import('../../features/palette/components/shortcut-list.tsx'));

const KEY_GROUPS = [{ title: 'Studio', keys: STUDIO_KEYS }];

/** Whether a key press belongs to something that is typed into. */
function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    (target.isContentEditable || target.closest('input, textarea, select, [role="grid"]') !== null)
  );
}

/** Keys that work everywhere: Ctrl/⌘ K opens the palette, ? the list of keys. */
export function ShortcutHost(rights: { isAdministrator: boolean; canCreateProgramme: boolean }) {
  const [open, setOpen] = useState<'palette' | 'keys' | null>(null);
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key.toLowerCase() === 'k' && (event.ctrlKey || event.metaKey)) {
        event.preventDefault();
        setOpen('palette');
      } else if (event.key === '?' && !isTyping(event.target)) setOpen('keys');
    };
    const onAsk = () => {
      setOpen('palette');
    };
    window.addEventListener('keydown', onKey);
    window.addEventListener(PALETTE_EVENT, onAsk);
    return () => {
      window.removeEventListener('keydown', onKey);
      window.removeEventListener(PALETTE_EVENT, onAsk);
    };
  }, []);
  const close = () => {
    setOpen(null);
  };
  return (
    <Suspense fallback={null}>
      {open === 'palette' && <Palette onClose={close} {...rights} />}
      {open === 'keys' && <ShortcutList onClose={close} groups={KEY_GROUPS} />}
    </Suspense>
  );
}
