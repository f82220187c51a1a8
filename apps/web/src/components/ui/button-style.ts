import { classNames } from './class-names.ts';

export type ButtonKind = 'primary' | 'plain' | 'quiet' | 'danger';

const KINDS: Record<ButtonKind, string> = {
  primary: 'border-accent bg-accent text-accent-ink font-medium hover:brightness-110',
  plain: 'border-rule-strong bg-sheet text-ink hover:border-ink',
  quiet: 'border-transparent bg-transparent text-ink hover:bg-panel',
  danger: 'border-fails bg-sheet text-fails hover:bg-fails-wash',
};

/** Look of a button, for links that act like one as well. One `primary` a screen: the thing to do next. */
export function buttonStyle(kind: ButtonKind = 'plain', small = false): string {
  return classNames(
    'inline-flex cursor-pointer items-center justify-center gap-2 rounded-xs border whitespace-nowrap no-underline',
    'disabled:cursor-not-allowed disabled:opacity-55 aria-disabled:cursor-not-allowed aria-disabled:opacity-55',
    small ? 'min-h-6 px-2 text-[13px]' : 'min-h-8 px-3',
    KINDS[kind],
  );
}
