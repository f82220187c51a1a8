import { useEffect, useRef } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';
import type { Destination } from '../lib/match-destinations.ts';

export function PaletteOptions({
  options,
  chosen,
  onGo,
}: {
  options: readonly Destination[];
  chosen: number;
  onGo: (to: string) => void;
}) {
  const current = useRef<HTMLLIElement>(null);
  useEffect(() => {
    current.current?.scrollIntoView({ block: 'nearest' });
  }, [chosen]);
  return (
    <ul
      id="palette-options"
      role="listbox"
      aria-label="Places"
      className="m-0 max-h-72 list-none overflow-y-auto p-0"
    >
      {options.map((option, i) => (
        <li
          key={option.to}
          ref={i === chosen ? current : null}
          id={`palette-option-${String(i)}`}
          role="option"
          aria-selected={i === chosen}
          className={classNames(
            'flex min-h-8 cursor-pointer items-center gap-3 px-2',
            i === chosen ? 'bg-panel shadow-[inset_2px_0_0_var(--accent)]' : 'hover:bg-panel',
          )}
          onClick={() => {
            onGo(option.to);
          }}
        >
          <span className="min-w-0 truncate">{option.name}</span>
          <span className="ml-auto text-[13px] whitespace-nowrap text-ink-soft">{option.kind}</span>
        </li>
      ))}
    </ul>
  );
}
