import type { Review } from '@tipward/contract';
import { decideReview } from '@tipward/contract';
import { Caution } from '../../../components/ui/caution.tsx';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormSelect, FormText, FormTextarea } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { HashLine } from '../../../components/record/hash-line.tsx';
import { useDecideReview } from '../api/change-review.ts';

/** The lead's signature: outcome, a word, the password again, over exactly the hashes shown. */
export function DecisionForm({ review }: { review: Review }) {
  const decide = useDecideReview();
  const { contentHash, specificationHash } = review;
  return (
    <Form
      schema={decideReview.body}
      defaultValues={{ outcome: 'approved', note: '', password: '', contentHash, specificationHash }}
      submitLabel="Sign the decision"
      onSubmit={async (body) => {
        await decide.mutateAsync({ params: { reviewId: review.id }, body });
        notify.done(
          body.outcome === 'approved'
            ? `${review.version.label} is approved`
            : `${review.version.label} is sent back`,
        );
      }}
    >
      <FormSelect
        name="outcome"
        label="Decision"
        options={[
          { value: 'approved', label: 'Approve' },
          { value: 'changes-requested', label: 'Ask for changes' },
        ]}
      />
      <FormTextarea name="note" label="Note" optional rows={3} />
      <FormText name="password" label="Your password again" type="password" autoComplete="current-password" />
      <dl className="m-0 grid gap-1">
        <HashLine label="You sign this content, SHA-256" hash={contentHash} />
        <HashLine label="under this specification, SHA-256" hash={specificationHash} />
      </dl>
      <Caution quiet />
    </Form>
  );
}
