import { Tooltip as Parts } from 'radix-ui';
import type { ReactNode } from 'react';

/** A short explanation on hover and focus. The child must take focus (a button or a link); never put the only copy of a fact here. */
export function Tooltip({ text, children }: { text: string; children: ReactNode }) {
  return (
    <Parts.Provider delayDuration={300}>
      <Parts.Root>
        <Parts.Trigger asChild>{children}</Parts.Trigger>
        <Parts.Portal>
          <Parts.Content
            sideOffset={4}
            collisionPadding={8}
            className="z-50 max-w-72 rounded-xs bg-ink px-2 py-1 text-[13px] text-paper shadow-float"
          >
            {text}
          </Parts.Content>
        </Parts.Portal>
      </Parts.Root>
    </Parts.Provider>
  );
}
