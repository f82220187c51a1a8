import type { ReactNode } from 'react';

/** Fields that belong together under a name. */
export function FieldSet({ legend, hint, children }: { legend: string; hint?: string; children: ReactNode }) {
  return (
    <fieldset className="m-0 min-w-0 border-0 border-t border-rule p-0 pt-3">
      <legend className="float-left mb-2 w-full p-0 text-base font-semibold">
        {legend}
        {hint !== undefined && <span className="ml-3 text-[13px] font-normal text-ink-soft">{hint}</span>}
      </legend>
      <div className="clear-both">{children}</div>
    </fieldset>
  );
}
