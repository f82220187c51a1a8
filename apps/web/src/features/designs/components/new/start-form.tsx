import { createDesign } from '@tipward/contract';
import type { AirfoilSummary, BodyInputOf, Programme } from '@tipward/contract';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { Form } from '../../../../components/ui/form/form.tsx';
import { FormText } from '../../../../components/ui/form/form-fields.tsx';
import { useCreateDesign } from '../../api/create-design.ts';

type Input = BodyInputOf<typeof createDesign>;

export interface StartGiven {
  readonly programme: Programme;
  readonly airfoils: readonly AirfoilSummary[];
  /** Name typed so far, kept when another way to begin is looked at. */
  readonly name: string;
  readonly onName: (name: string) => void;
}

/** Name, what this way to begin needs, and off into the draft. */
export function StartForm({
  programme,
  name,
  onName,
  start,
  children,
}: StartGiven & {
  start: Input['start'];
  children: ReactNode;
}) {
  const create = useCreateDesign();
  const navigate = useNavigate();
  return (
    <Form
      schema={createDesign.body}
      defaultValues={{ name, start }}
      submitLabel="Open the draft"
      onSubmit={async (body) => {
        const { draft } = await create.mutateAsync({ params: { programmeId: programme.id }, body });
        await navigate(`/drafts/${draft.id}`);
      }}
      actions={<ButtonLink to={`/programmes/${programme.id}`}>Cancel</ButtonLink>}
    >
      <FormText
        name="name"
        label="Name of the design"
        onInput={(event) => {
          onName(event.currentTarget.value);
        }}
      />
      {children}
    </Form>
  );
}
