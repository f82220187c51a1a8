import { createProgramme } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { FormPage } from '../../../../components/ui/form/form-page.tsx';
import { FormText, FormTextarea } from '../../../../components/ui/form/form-fields.tsx';
import { useCreateProgramme } from '../../api/create-programme.ts';
import { NEW_SPECIFICATION } from '../../lib/new-specification.ts';
import { RequirementsEditor } from './requirements-editor.tsx';
import { SpecificationInputs } from './specification-inputs.tsx';

export function NewProgrammePage() {
  const create = useCreateProgramme();
  const navigate = useNavigate();
  return (
    <FormPage
      header={{ title: 'New programme', trail: [{ label: 'Programmes', to: '/' }] }}
      intro="One turbine’s rotor. You become its lead; what is entered here is issue 1 of the specification."
      schema={createProgramme.body}
      defaultValues={{ name: '', summary: '', specification: NEW_SPECIFICATION, requirements: [] }}
      submitLabel="Create the programme"
      onSubmit={async (body) => {
        const programme = await create.mutateAsync({ body });
        await navigate(`/programmes/${programme.id}`);
      }}
      actions={<ButtonLink to="/">Cancel</ButtonLink>}
    >
      <FormText name="name" label="Name" autoFocus />
      <FormTextarea name="summary" label="Summary" optional />
      <SpecificationInputs />
      <RequirementsEditor />
    </FormPage>
  );
}
