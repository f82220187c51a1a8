import type { Design } from '@tipward/contract';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { DraftBadge } from '../../../components/ui/state-badge.tsx';
import { useDiscardDraft } from '../api/discard-draft.ts';

type Draft = Design['drafts'][number];

const origin = (draft: Draft) =>
  draft.parentLabel === null ? 'First draft' : `Draft from ${draft.parentLabel}`;

function Discard({ draft, onClose }: { draft: Draft; onClose: () => void }) {
  const discard = useDiscardDraft();
  return (
    <ConfirmDialog
      open
      onOpenChange={onClose}
      title="Discard the draft?"
      confirmLabel="Discard the draft"
      kind="danger"
      busy={discard.isPending}
      error={discard.error}
      onConfirm={() => {
        discard.mutate(draft.id, { onSuccess: onClose });
      }}
    >
      {origin(draft)}, edited <Moment at={draft.updatedAt} />. Its stations and settings are gone for good;
      saved versions stay.
    </ConfirmDialog>
  );
}

/** The reader's own drafts of this design. */
export function DraftsSection({ design }: { design: Design }) {
  const [discarding, setDiscarding] = useState<Draft | null>(null);
  if (design.drafts.length === 0) return null;
  return (
    <Section title="Your drafts" note="Nobody else sees them.">
      <ul className="m-0 list-none p-0">
        {design.drafts.map((draft) => (
          <li key={draft.id} className="flex flex-wrap items-center gap-x-4 border-b border-rule py-1">
            <Link to={`/drafts/${draft.id}`} className="link font-medium">
              {origin(draft)}
            </Link>
            <DraftBadge />
            <span className="text-[13px] text-ink-soft">
              edited <Moment at={draft.updatedAt} />
            </span>
            <Button
              small
              kind="quiet"
              className="ml-auto"
              aria-label={`Discard: ${origin(draft)}`}
              onClick={() => {
                setDiscarding(draft);
              }}
            >
              Discard
            </Button>
          </li>
        ))}
      </ul>
      {discarding !== null && (
        <Discard
          draft={discarding}
          onClose={() => {
            setDiscarding(null);
          }}
        />
      )}
    </Section>
  );
}
