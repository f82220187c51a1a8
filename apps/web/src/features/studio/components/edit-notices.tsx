import type { DraftContent } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { formatMoment } from '../../../lib/time/format-time.ts';
import type { Autosave } from '../hooks/use-autosave.ts';
import { ChooseEditDialog } from './choose-edit-dialog.tsx';

const STRIP = 'flex flex-wrap items-center gap-3 border-l-2 px-3 py-1 text-[13px]';

/** Offers edits of an earlier visit, and asks what shall stand when the draft was saved elsewhere meanwhile. */
export function EditNotices({
  autosave,
  content,
  onTake,
  onMine,
  onTheirs,
}: {
  autosave: Autosave;
  content: DraftContent;
  /** Takes up a content as one undoable step. */
  onTake: (content: DraftContent) => void;
  onMine: (stored: DraftContent) => void;
  onTheirs: (stored: DraftContent) => void;
}) {
  const { state, leftOver, dropLeftOver } = autosave;
  const [looking, setLooking] = useState(false);
  // A conflict opens its question by itself, once; it stays as a strip when put off.
  const [putOff, setPutOff] = useState(false);
  const conflict = state.kind === 'conflict' ? state : null;
  if (conflict === null && putOff) setPutOff(false);
  return (
    <>
      {leftOver !== null && (
        <div role="status" className={`${STRIP} border-look bg-look-wash`}>
          Edits of {formatMoment(leftOver.at)} did not reach the server; they were kept on this machine.
          <Button
            small
            onClick={() => {
              setLooking(true);
            }}
          >
            Look at the differences
          </Button>
          <Button small kind="quiet" onClick={dropLeftOver}>
            Leave them set aside
          </Button>
        </div>
      )}
      {leftOver !== null && looking && (
        <ChooseEditDialog
          open
          onOpenChange={setLooking}
          title="Edits kept on this machine"
          mine={leftOver.content}
          theirs={content}
          mineLabel="kept edits"
          theirsLabel="stored draft"
          onMine={() => {
            onTake(leftOver.content);
            setLooking(false);
            dropLeftOver();
          }}
          onTheirs={() => {
            setLooking(false);
            dropLeftOver();
          }}
        >
          They were made on {formatMoment(leftOver.at)} and never stored. Choose which shall stand.
        </ChooseEditDialog>
      )}
      {conflict !== null && (
        <div role="alert" className={`${STRIP} border-fails bg-fails-wash`}>
          This draft was saved in another window meanwhile. Nothing is overwritten until you choose.
          <Button
            small
            onClick={() => {
              setPutOff(false);
            }}
          >
            Look at both
          </Button>
        </div>
      )}
      {conflict !== null && (
        <ChooseEditDialog
          open={!putOff}
          onOpenChange={(open) => {
            setPutOff(!open);
          }}
          title="Saved elsewhere meanwhile"
          mine={content}
          theirs={conflict.stored.content}
          mineLabel="mine"
          theirsLabel="stored"
          onMine={() => {
            onMine(conflict.stored.content);
          }}
          onTheirs={() => {
            onTheirs(conflict.stored.content);
          }}
        >
          The draft was stored by another window on {formatMoment(conflict.stored.updatedAt)} while you were
          editing here. Both stand below, cell by cell.
        </ChooseEditDialog>
      )}
    </>
  );
}
