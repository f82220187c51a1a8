import type { Draft } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { useDiscardDraft } from '../api/discard-draft.ts';
import type { Autosave } from '../hooks/use-autosave.ts';

/** Asks before a draft is thrown away, and throws it away. */
export function DiscardDialog({
  draft,
  autosave,
  onClose,
}: {
  draft: Draft;
  autosave: Autosave;
  onClose: () => void;
}) {
  const discard = useDiscardDraft();
  const navigate = useNavigate();
  const confirm = async () => {
    await autosave.saver.flush();
    discard.mutate(
      { params: { draftId: draft.id }, ifMatch: autosave.saver.currentETag() },
      {
        onSuccess: () => {
          autosave.kept.forget();
          void navigate(`/designs/${draft.designId}`);
        },
      },
    );
  };
  return (
    <ConfirmDialog
      open
      onOpenChange={onClose}
      title="Discard this draft?"
      confirmLabel="Discard draft"
      kind="danger"
      busy={discard.isPending}
      error={discard.error}
      onConfirm={() => void confirm()}
    >
      The draft of {draft.designName}
      {draft.parentLabel === null ? '' : ` opened from ${draft.parentLabel}`} and its edits are gone for good.
      Saved versions are not touched.
    </ConfirmDialog>
  );
}
