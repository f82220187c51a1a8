import { Tabs as Parts } from 'radix-ui';
import type { ReactNode } from 'react';

export interface Tab {
  readonly id: string;
  readonly label: ReactNode;
  readonly content: ReactNode;
}

/** Tabs whose choice the caller keeps (in the URL, so that a link shows what its sender saw). */
export function Tabs({
  label,
  tabs,
  value,
  onChange,
}: {
  /** Read out as the name of the row of tabs. */
  label: string;
  tabs: readonly Tab[];
  value: string;
  onChange: (id: string) => void;
}) {
  return (
    <Parts.Root value={value} onValueChange={onChange}>
      <Parts.List
        aria-label={label}
        className="flex gap-5 overflow-x-auto shadow-[inset_0_-1px_0_var(--rule)]"
      >
        {tabs.map((tab) => (
          <Parts.Trigger
            key={tab.id}
            value={tab.id}
            className="min-h-8 shrink-0 cursor-pointer border-0 border-b-2 border-transparent bg-transparent px-0 text-ink-soft hover:text-ink data-[state=active]:border-accent data-[state=active]:font-medium data-[state=active]:text-ink"
          >
            {tab.label}
          </Parts.Trigger>
        ))}
      </Parts.List>
      {tabs.map((tab) => (
        <Parts.Content key={tab.id} value={tab.id} className="pt-4">
          {tab.content}
        </Parts.Content>
      ))}
    </Parts.Root>
  );
}
