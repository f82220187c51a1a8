import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { DialogActions } from '../../../components/ui/dialog-actions.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { Textarea } from '../../../components/ui/textarea.tsx';
import { ApiProblem } from '../../../lib/api/api-problem.ts';
import { useAddAirfoil } from '../api/add-airfoil.ts';
import { readAirfoilFile } from '../lib/airfoil-file.ts';
import { AirfoilFileInput } from './airfoil-file-input.tsx';
import { AirfoilPreview } from './airfoil-preview.tsx';
import { FileShape } from './file-shape.tsx';

const refusal = (faults: ConstructorParameters<typeof ApiProblem>[0]['faults']) =>
  new ApiProblem({
    type: 'about:blank',
    title: 'This is not yet an airfoil. All that is wrong with it:',
    status: 422,
    code: 'invalid',
    faults,
  });

/** An airfoil from a JSON file: looked at before it is added, because it can never be changed afterwards. */
export function NewAirfoilPage() {
  const add = useAddAirfoil();
  const navigate = useNavigate();
  const [text, setText] = useState('');
  const read = text.trim() === '' ? null : readAirfoilFile(text);
  const airfoil = read?.airfoil ?? null;
  const submit = () => {
    if (airfoil === null) return;
    add.mutate({ body: airfoil }, { onSuccess: ({ id }) => void navigate(`/airfoils/${id}`) });
  };
  return (
    <div className="mx-auto max-w-3xl">
      <PageHeader
        title="Add an airfoil"
        trail={[{ label: 'Airfoils', to: '/airfoils' }]}
        meta="Once added it never changes: designs pin it by its hash."
      />
      <div className="flex flex-col gap-4">
        <AirfoilFileInput onText={setText} />
        <Textarea
          label="Airfoil as JSON"
          figures
          rows={8}
          spellCheck={false}
          value={text}
          onChange={(event) => {
            setText(event.target.value);
          }}
        />
        <FileShape />
        {read !== null && airfoil === null && <Problem error={refusal([...read.faults])} />}
        {airfoil !== null && <AirfoilPreview airfoil={airfoil} />}
        {add.error !== null && <Problem error={add.error} title="The airfoil was not added." />}
        <DialogActions>
          <ButtonLink to="/airfoils">Cancel</ButtonLink>
          <Button kind="primary" disabled={airfoil === null} busy={add.isPending} onClick={submit}>
            Add to the library
          </Button>
        </DialogActions>
      </div>
    </div>
  );
}
