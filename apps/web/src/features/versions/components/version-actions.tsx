import type { Version } from '@tipward/contract';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { useOpenDraft } from '../api/open-draft.ts';
import { AskForReviewDialog } from './ask-for-review-dialog.tsx';
import { ReleaseDialog } from './release-dialog.tsx';

/** What the person may do with the version now; the one thing to do next stands out. */
export function VersionActions({ version }: { version: Version }) {
  const [open, setOpen] = useState<'review' | 'release' | null>(null);
  const draft = useOpenDraft();
  const navigate = useNavigate();
  const { abilities } = version;
  const close = () => {
    setOpen(null);
  };
  const edit = () => {
    draft.mutate(
      { params: { designId: version.designId }, body: { fromVersionId: version.id } },
      {
        onSuccess: (opened) => void navigate(`/drafts/${opened.id}`),
        onError: (error) => {
          notify.failed('The draft could not be opened', error);
        },
      },
    );
  };
  return (
    <>
      {version.parentId !== null && (
        <ButtonLink to={`/compare?v=${version.parentId}&v=${version.id}`}>
          Compare with {version.parentLabel ?? 'parent'}
        </ButtonLink>
      )}
      {version.reviewId !== null && <ButtonLink to={`/reviews/${version.reviewId}`}>Review</ButtonLink>}
      {version.release !== null && (
        <ButtonLink to={`/releases/${version.release.id}`}>Release {version.release.letter}</ButtonLink>
      )}
      {abilities.openDraft && (
        <Button busy={draft.isPending} onClick={edit}>
          Open draft from it
        </Button>
      )}
      {abilities.askForReview && (
        <Button
          kind="primary"
          onClick={() => {
            setOpen('review');
          }}
        >
          Ask for review
        </Button>
      )}
      {abilities.release && (
        <Button
          kind="primary"
          onClick={() => {
            setOpen('release');
          }}
        >
          Release
        </Button>
      )}
      {open === 'review' && <AskForReviewDialog version={version} onClose={close} />}
      {open === 'release' && <ReleaseDialog version={version} onClose={close} />}
    </>
  );
}
