import type { DraftContent } from '@tipward/contract';
import { useMemo } from 'react';
import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { DialogActions } from '../../../components/ui/dialog-actions.tsx';
import { draftDifferences } from '../lib/draft-differences.ts';

/** Two states of one draft side by side, cell by cell, and the choice between them. Closing it chooses nothing. */
export function ChooseEditDialog({
  open,
  onOpenChange,
  title,
  children,
  mine,
  theirs,
  mineLabel,
  theirsLabel,
  onMine,
  onTheirs,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  children: ReactNode;
  mine: DraftContent;
  theirs: DraftContent;
  mineLabel: string;
  theirsLabel: string;
  onMine: () => void;
  onTheirs: () => void;
}) {
  const differences = useMemo(() => draftDifferences(mine, theirs), [mine, theirs]);
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title={title} wide>
      <div>{children}</div>
      <div
        className="max-h-80 overflow-auto border border-rule"
        role="region"
        aria-label="Differences"
        tabIndex={0}
      >
        <table className="w-full border-collapse text-[13px]">
          <thead className="sticky top-0 bg-panel text-left">
            <tr>
              <th scope="col" className="px-2 py-1 font-medium">
                Where ({differences.length})
              </th>
              <th scope="col" className="px-2 py-1 text-right font-medium">
                {mineLabel}
              </th>
              <th scope="col" className="px-2 py-1 text-right font-medium">
                {theirsLabel}
              </th>
            </tr>
          </thead>
          <tbody>
            {differences.map((each) => (
              <tr key={each.where} className="border-t border-rule">
                <th scope="row" className="px-2 text-left font-normal">
                  {each.where}
                </th>
                <td className="figures px-2 text-right">{each.mine}</td>
                <td className="figures px-2 text-right">{each.theirs}</td>
              </tr>
            ))}
          </tbody>
        </table>
        {differences.length === 0 && <p className="m-0 p-2">Both hold the same.</p>}
      </div>
      <p className="m-0 text-[13px] text-ink-soft">
        The other one is not lost: undo brings it back, and it stays under ‘Set aside’ on this machine.
      </p>
      <DialogActions>
        <Button onClick={onTheirs}>Take {theirsLabel}</Button>
        <Button kind="primary" onClick={onMine}>
          Keep {mineLabel}
        </Button>
      </DialogActions>
    </Dialog>
  );
}
