import type { Fault, Verdict } from '@tipward/contract';
import { saveVersion } from '@tipward/contract';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { DialogActions } from '../../../components/ui/dialog-actions.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { Textarea } from '../../../components/ui/textarea.tsx';
import { VerdictCounts } from '../../../components/ui/verdict-counts.tsx';
import { useSaveVersion } from '../api/save-version.ts';
import type { Autosave } from '../hooks/use-autosave.ts';

export interface SaveVersionDialogProps {
  readonly draftId: string;
  readonly autosave: Autosave;
  readonly faults: readonly Fault[];
  readonly verdicts: readonly Verdict[] | null;
  readonly onClose: () => void;
}

/** Why a version cannot be made of this draft yet; null when it can. */
function noteFault(note: string): string | undefined {
  const parsed = saveVersion.body.safeParse({ note });
  return parsed.success ? undefined : parsed.error.issues[0]?.message;
}

function FaultList({ faults }: { faults: readonly Fault[] }) {
  return (
    <div role="alert" className="border-l-2 border-fails bg-fails-wash px-3 py-2">
      <p className="m-0 font-medium">
        {faults.length === 1 ? 'One fault stands' : `${faults.length} faults stand`} in the way of a version:
      </p>
      <ul className="m-0 mt-1 max-h-48 list-none overflow-auto p-0 text-[13px]">
        {faults.map((fault) => (
          <li key={`${fault.field}-${fault.message}`}>
            <span className="figures">
              {fault.field.replace(/\[(\d+)\]/u, (_, i) => ` ${Number(i) + 1}`)}
            </span>{' '}
            <span className="figures text-ink-soft">{fault.value}</span>: {fault.message}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** Makes the next version of the draft: a note, and what forbids it. The server evaluates and keeps it for good. */
export function SaveVersionDialog({ draftId, autosave, faults, verdicts, onClose }: SaveVersionDialogProps) {
  const [note, setNote] = useState('');
  const [asked, setAsked] = useState(false);
  const [unsaved, setUnsaved] = useState<string | null>(null);
  const save = useSaveVersion();
  const navigate = useNavigate();
  const fault = noteFault(note);
  const submit = async () => {
    setAsked(true);
    setUnsaved(null);
    if (fault !== undefined || faults.length > 0) return;
    await autosave.saver.flush();
    if (autosave.saver.getState().kind !== 'saved') {
      setUnsaved('The latest edits are not stored yet; see the state of the draft above.');
      return;
    }
    save.mutate(
      { params: { draftId }, body: { note }, ifMatch: autosave.saver.currentETag() },
      {
        onSuccess: (version) => {
          autosave.kept.forget();
          void navigate(`/versions/${version.id}`);
        },
      },
    );
  };
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Save a version"
      description="A version cannot be changed afterwards. The server evaluates it and writes what changed against its parent."
    >
      {faults.length > 0 && <FaultList faults={faults} />}
      {verdicts !== null && (
        <p className="m-0 text-[13px]">
          Requirements as solved here: <VerdictCounts verdicts={verdicts} />
        </p>
      )}
      <Textarea
        label="Note"
        hint="What you changed and why; the numbers are added by themselves."
        value={note}
        maxLength={500}
        error={asked ? fault : undefined}
        onChange={(event) => {
          setNote(event.target.value);
        }}
      />
      {unsaved !== null && <p className="m-0 text-fails">{unsaved}</p>}
      {save.error !== null && <Problem error={save.error} title="No version was saved." />}
      <DialogActions>
        <Button onClick={onClose}>Go on editing</Button>
        <Button
          kind="primary"
          busy={save.isPending}
          disabled={faults.length > 0}
          onClick={() => void submit()}
        >
          Save version
        </Button>
      </DialogActions>
    </Dialog>
  );
}
