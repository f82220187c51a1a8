import { CAUTION } from '@tipward/design-model';
import { classNames } from './class-names.ts';

/** The caution that goes with every number which could reach a built blade. */
export function Caution({ quiet = false }: { quiet?: boolean }) {
  return (
    <p
      className={classNames(
        'm-0 max-w-[90ch] text-[13px]',
        quiet ? 'text-ink-soft' : 'border-l-2 border-look pl-3',
      )}
    >
      {CAUTION}
    </p>
  );
}
