import { DropdownMenu } from 'radix-ui';
import type { ReactNode } from 'react';

/** A menu that opens from a button; arrows move, Escape closes. Give `MenuItem`s, `MenuRule`s and `MenuLabel`s. */
export function Menu({
  trigger,
  children,
  defaultOpen = false,
}: {
  /** A button element. */
  trigger: ReactNode;
  children: ReactNode;
  defaultOpen?: boolean | undefined;
}) {
  return (
    <DropdownMenu.Root defaultOpen={defaultOpen} modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Content
        align="end"
        sideOffset={4}
        collisionPadding={8}
        className="z-50 min-w-48 rounded-xs border border-rule-strong bg-paper py-1 shadow-float"
      >
        {children}
      </DropdownMenu.Content>
    </DropdownMenu.Root>
  );
}

const ITEM =
  'flex min-h-8 cursor-pointer items-center gap-2 px-3 outline-none data-disabled:cursor-not-allowed data-disabled:opacity-55 data-highlighted:bg-panel data-highlighted:shadow-[inset_2px_0_0_var(--accent)]';

export function MenuItem({
  children,
  disabled = false,
  onSelect,
}: {
  children: ReactNode;
  disabled?: boolean;
  onSelect: () => void;
}) {
  return (
    <DropdownMenu.Item disabled={disabled} onSelect={onSelect} className={ITEM}>
      {children}
    </DropdownMenu.Item>
  );
}

/** One of several choices, the present one ticked. */
export function MenuChoice<T extends string>({
  value,
  options,
  onChoose,
}: {
  value: T;
  options: readonly { value: T; label: string }[];
  onChoose: (value: T) => void;
}) {
  return (
    <DropdownMenu.RadioGroup value={value}>
      {options.map((option) => (
        <DropdownMenu.RadioItem
          key={option.value}
          value={option.value}
          onSelect={(event) => {
            event.preventDefault();
            onChoose(option.value);
          }}
          className={ITEM}
        >
          <span className="w-3" aria-hidden="true">
            {option.value === value ? '✓' : ''}
          </span>
          {option.label}
        </DropdownMenu.RadioItem>
      ))}
    </DropdownMenu.RadioGroup>
  );
}

export function MenuRule() {
  return <DropdownMenu.Separator className="my-1 h-px bg-rule" />;
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return <DropdownMenu.Label className="px-3 py-1 text-[13px] text-ink-soft">{children}</DropdownMenu.Label>;
}
