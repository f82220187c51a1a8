import { addComment } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { useState } from 'react';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormTextarea } from '../../../components/ui/form/form-fields.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { useAddComment } from '../api/change-review.ts';

interface Props {
  readonly reviewId: string;
  /** Set for a reply. */
  readonly replyTo?: string;
  /** Radii comments may be pinned to; none for a reply. */
  readonly stationRadiiM?: readonly number[];
  /** The station of the span cursor, offered first. */
  readonly nearRadiusM?: number | null;
  readonly onDone?: () => void;
}

const WHOLE = '';

function nearest(radii: readonly number[], radiusM: number | null | undefined): string {
  if (radiusM === null || radiusM === undefined || radii.length === 0) return WHOLE;
  return String(radii.reduce((best, r) => (Math.abs(r - radiusM) < Math.abs(best - radiusM) ? r : best)));
}

/** A comment on the version or on one of its stations, or a reply. */
export function CommentForm({ reviewId, replyTo, stationRadiiM = [], nearRadiusM, onDone }: Props) {
  const add = useAddComment();
  const [picked, setPicked] = useState<string | null>(null);
  const [written, setWritten] = useState(0);
  const station = picked ?? nearest(stationRadiiM, nearRadiusM);
  return (
    <Form
      key={written}
      schema={addComment.body}
      defaultValues={{ text: '', stationRadiusM: null, replyTo: replyTo ?? null }}
      submitLabel={replyTo === undefined ? 'Comment' : 'Reply'}
      onSubmit={async (body) => {
        const stationRadiusM = station === WHOLE ? null : Number(station);
        await add.mutateAsync({ params: { reviewId }, body: { ...body, stationRadiusM } });
        setWritten(written + 1);
        setPicked(null);
        onDone?.();
      }}
    >
      {stationRadiiM.length > 0 && (
        <Select
          label="About"
          value={station}
          onChange={(event) => {
            setPicked(event.target.value);
          }}
          options={[
            { value: WHOLE, label: 'the version as a whole' },
            ...stationRadiiM.map((r) => ({
              value: String(r),
              label: `station r ${formatQuantity('radiusM', r)} m`,
            })),
          ]}
        />
      )}
      <FormTextarea name="text" label={replyTo === undefined ? 'Comment' : 'Reply'} rows={3} />
    </Form>
  );
}
