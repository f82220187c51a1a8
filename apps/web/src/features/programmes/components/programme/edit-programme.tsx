import { getProgramme, updateProgramme } from '@tipward/contract';
import type { Programme } from '@tipward/contract';
import { useState } from 'react';
import { Dialog } from '../../../../components/ui/dialog.tsx';
import { Form } from '../../../../components/ui/form/form.tsx';
import { FormText, FormTextarea } from '../../../../components/ui/form/form-fields.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { asProblem } from '../../../../lib/api/api-problem.ts';
import { useTagged } from '../../../../lib/api/use-tagged.ts';
import { useUpdateProgramme } from '../../api/update-programme.ts';

/** What stands now, shown to whoever lost the race. */
interface Theirs {
  readonly name: string;
  readonly summary: string;
  readonly etag: string;
}

function EditForm({ programme, etag, onClose }: { programme: Programme; etag: string; onClose: () => void }) {
  const update = useUpdateProgramme();
  const [theirs, setTheirs] = useState<Theirs | null>(null);
  return (
    <>
      {theirs !== null && (
        <div role="alert" className="border-l-2 border-look bg-look-wash px-3 py-2">
          Somebody changed it meanwhile. It now reads <strong>{theirs.name}</strong>
          {theirs.summary !== '' && <>: {theirs.summary}</>}. Save again to put yours in its place, or close
          to keep theirs.
        </div>
      )}
      <Form
        schema={updateProgramme.body}
        defaultValues={{ name: programme.name, summary: programme.summary }}
        submitLabel={theirs === null ? 'Save' : 'Put mine in its place'}
        onSubmit={async (body) => {
          try {
            await update.mutateAsync({
              params: { programmeId: programme.id },
              body,
              ifMatch: theirs?.etag ?? etag,
            });
          } catch (error) {
            const problem = asProblem(error);
            if (problem.code !== 'stale' || problem.currentETag === null) throw error;
            const { name, summary } = problem.current as Programme;
            setTheirs({ name, summary, etag: problem.currentETag });
            return;
          }
          onClose();
        }}
      >
        <FormText name="name" label="Name" />
        <FormTextarea name="summary" label="Summary" optional />
      </Form>
    </>
  );
}

export function EditProgramme({ programmeId, onClose }: { programmeId: string; onClose: () => void }) {
  const tagged = useTagged(getProgramme, { params: { programmeId } });
  return (
    <Dialog open onOpenChange={onClose} title="Name and summary">
      <Loaded query={tagged} what="the programme">
        {({ body, etag }) => <EditForm programme={body} etag={etag ?? ''} onClose={onClose} />}
      </Loaded>
    </Dialog>
  );
}
