import type { Version } from '@tipward/contract';
import { releaseVersion } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { Caution } from '../../../components/ui/caution.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Form } from '../../../components/ui/form/form.tsx';
import { FormText, FormTextarea } from '../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { useReleaseVersion } from '../api/release-version.ts';

/** Releases an approved version: letter, package and the end of the release before; cannot be undone. */
export function ReleaseDialog({ version, onClose }: { version: Version; onClose: () => void }) {
  const release = useReleaseVersion();
  const navigate = useNavigate();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Release ${version.designName} ${version.label}`}
      description="It gets the next letter of the programme and a frozen package; the release before it is superseded and every member is told. This cannot be undone."
    >
      <Form
        schema={releaseVersion.body}
        defaultValues={{ effectivity: '', note: '', password: '' }}
        submitLabel="Release"
        onSubmit={async (body) => {
          const made = await release.mutateAsync({ params: { versionId: version.id }, body });
          notify.done(`Released as ${made.letter}`);
          await navigate(`/releases/${made.id}`);
        }}
      >
        <FormText name="effectivity" label="Effectivity" hint="From which turbine or date it applies" />
        <FormTextarea name="note" label="Note" optional rows={3} />
        <FormText
          name="password"
          label="Your password again"
          type="password"
          autoComplete="current-password"
        />
        <Caution quiet />
      </Form>
    </Dialog>
  );
}
