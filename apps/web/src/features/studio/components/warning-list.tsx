import type { Warning } from '@tipward/contract';
import type { CursorStore } from '../lib/cursor-store.ts';
import { Pending } from './pending.tsx';

/** What to look at before the numbers are believed; one that concerns a station leads there. */
export function WarningList({
  warnings,
  current,
  stationRadiiM,
  cursors,
}: {
  warnings: readonly Warning[];
  current: boolean;
  stationRadiiM: readonly number[];
  cursors: CursorStore;
}) {
  return (
    <section aria-label="Warnings" className="mt-2">
      <h2 className="m-0 text-sm font-medium">
        Warnings <span className="figures text-xs font-normal text-ink-soft">{warnings.length}</span>
      </h2>
      <Pending current={current} reason={null}>
        {warnings.length === 0 ? (
          <p className="m-0 text-xs text-ink-soft">None.</p>
        ) : (
          <ul className="m-0 list-none p-0">
            {warnings.map((warning, i) => {
              const radiusM = warning.station === null ? undefined : stationRadiiM[warning.station];
              return (
                <li key={i} className="flex gap-2 border-t border-rule py-0.5 text-xs">
                  <span aria-hidden="true" className="text-look">
                    ▲
                  </span>
                  <span className="min-w-0 flex-1">{warning.message}</span>
                  {radiusM !== undefined && (
                    <button
                      type="button"
                      className="link figures min-h-6 cursor-pointer border-0 bg-transparent p-0 text-xs whitespace-nowrap"
                      onClick={() => {
                        cursors.setRadius(radiusM);
                      }}
                    >
                      station {(warning.station ?? 0) + 1}
                    </button>
                  )}
                </li>
              );
            })}
          </ul>
        )}
      </Pending>
    </section>
  );
}
