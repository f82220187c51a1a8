import { CAUTION } from '@tipward/design-model';

export function FrameFooter({ demo }: { demo: boolean }) {
  return (
    <footer className="border-t border-rule px-4 py-3 text-xs text-ink-soft sm:px-6">
      <p className="m-0 max-w-[120ch]">{CAUTION}</p>
      {demo && <p className="m-0 mt-1">Demonstration: people, programmes and airfoils are invented.</p>}
    </footer>
  );
}
