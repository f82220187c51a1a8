import type { Version } from '@tipward/contract';
import { askForReview } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormTextarea } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { useAskForReview } from '../api/ask-for-review.ts';

/** Puts the version before the leads, with a word to them. */
export function AskForReviewDialog({ version, onClose }: { version: Version; onClose: () => void }) {
  const ask = useAskForReview();
  const navigate = useNavigate();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Ask for review of ${version.label}`}
      description="The leads of the programme get an e-mail. The version itself cannot change any more; what follows is the next version."
    >
      <Form
        schema={askForReview.body}
        defaultValues={{ message: '' }}
        submitLabel="Ask for review"
        onSubmit={async (body) => {
          const review = await ask.mutateAsync({ params: { versionId: version.id }, body });
          notify.done(`${version.label} is in review`);
          await navigate(`/reviews/${review.id}`);
        }}
      >
        <FormTextarea name="message" label="Message to the leads" optional rows={4} />
      </Form>
    </Dialog>
  );
}
