import { getDesign, renameDesign } from '@tipward/contract';
import type { Design } from '@tipward/contract';
import { useState } from 'react';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText } from '../../../components/ui/form/form-fields.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { asProblem } from '../../../lib/api/api-problem.ts';
import { useTagged } from '../../../lib/api/use-tagged.ts';
import { useRenameDesign } from '../api/rename-design.ts';

function RenameForm({ design, etag, onClose }: { design: Design; etag: string; onClose: () => void }) {
  const rename = useRenameDesign();
  const [theirs, setTheirs] = useState<{ name: string; etag: string } | null>(null);
  return (
    <>
      {theirs !== null && (
        <p role="alert" className="m-0 border-l-2 border-look bg-look-wash px-3 py-2">
          Somebody renamed it meanwhile: it is called <strong>{theirs.name}</strong>. Save again to put your
          name in its place, or close to keep theirs.
        </p>
      )}
      <Form
        schema={renameDesign.body}
        defaultValues={{ name: design.name }}
        submitLabel={theirs === null ? 'Save' : 'Put mine in its place'}
        onSubmit={async (body) => {
          try {
            await rename.mutateAsync({
              params: { designId: design.id },
              body,
              ifMatch: theirs?.etag ?? etag,
            });
          } catch (error) {
            const problem = asProblem(error);
            if (problem.code !== 'stale' || problem.currentETag === null) throw error;
            setTheirs({ name: (problem.current as Design).name, etag: problem.currentETag });
            return;
          }
          onClose();
        }}
      >
        <FormText name="name" label="Name" />
      </Form>
    </>
  );
}

export function RenameDesign({ designId, onClose }: { designId: string; onClose: () => void }) {
  const tagged = useTagged(getDesign, { params: { designId } });
  return (
    <Dialog open onOpenChange={onClose} title="Rename the design">
      <Loaded query={tagged} what="the design">
        {({ body, etag }) => <RenameForm design={body} etag={etag ?? ''} onClose={onClose} />}
      </Loaded>
    </Dialog>
  );
}
