import { Dialog as Parts } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

export interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  /** One sentence under the title; read out when the dialogue opens. */
  description?: string | undefined;
  wide?: boolean | undefined;
  children: ReactNode;
}

/** A modal dialogue: focus stays inside, Escape closes, focus returns to where it was. */
export function Dialog({ open, onOpenChange, title, description, wide = false, children }: DialogProps) {
  return (
    <Parts.Root open={open} onOpenChange={onOpenChange}>
      <Parts.Portal>
        <Parts.Overlay className="fixed inset-0 z-40 bg-[#0a101e]/45" />
        <Parts.Content
          {...(description === undefined ? { 'aria-describedby': undefined } : {})}
          className={classNames(
            'fixed inset-x-4 top-4 z-50 mx-auto flex max-h-[calc(100dvh-2rem)] flex-col overflow-y-auto rounded-xs border border-rule-strong bg-paper p-5 shadow-float sm:top-[10vh] sm:max-h-[80vh]',
            wide ? 'max-w-3xl' : 'max-w-lg',
          )}
        >
          <Parts.Title className="m-0 pr-9 text-lg font-semibold wrap-anywhere">{title}</Parts.Title>
          {description !== undefined && (
            <Parts.Description className="m-0 mt-1 text-ink-soft">{description}</Parts.Description>
          )}
          <div className="mt-4 flex flex-col gap-4">{children}</div>
          {/* Last, so that the focus begins in what the dialogue is about. */}
          <Parts.Close
            aria-label="Close"
            className="absolute top-4 right-4 grid size-7 shrink-0 cursor-pointer place-items-center rounded-xs border-0 bg-transparent text-lg text-ink-soft hover:bg-panel hover:text-ink"
          >
            <span aria-hidden="true">×</span>
          </Parts.Close>
        </Parts.Content>
      </Parts.Portal>
    </Parts.Root>
  );
}
