import { issueSpecification } from '@tipward/contract';
import type { SpecificationIssue } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../../components/ui/button.tsx';
import { Form } from '../../../../components/ui/form/form.tsx';
import { FormText } from '../../../../components/ui/form/form-fields.tsx';
import { notify } from '../../../../components/ui/notify.ts';
import { asProblem } from '../../../../lib/api/api-problem.ts';
import { useIssueSpecification, useReadIssuesAgain } from '../../api/issue-specification.ts';
import { Overtaken } from './overtaken.tsx';
import { RequirementsEditor } from './requirements-editor.tsx';
import { SpecificationInputs } from './specification-inputs.tsx';

type Body = (typeof issueSpecification)['body']['_output'];

/** Edits a copy of the latest issue. Whoever was overtaken sees the other issue beside theirs, and chooses. */
export function IssueForm({
  programmeId,
  latest,
  onDone,
}: {
  programmeId: string;
  latest: SpecificationIssue;
  onDone: () => void;
}) {
  const issue = useIssueSpecification();
  const readAgain = useReadIssuesAgain();
  const [from] = useState(latest);
  const [mine, setMine] = useState<Body | null>(null);
  const overtaken = mine !== null && latest.issue !== from.issue;
  const submit = async (body: Body) => {
    try {
      const made = await issue.mutateAsync({
        params: { programmeId },
        body: overtaken ? { ...body, afterIssue: latest.issue } : body,
      });
      notify.done(`Issue ${String(made.issue)} of the specification is made.`);
      onDone();
    } catch (error) {
      if (asProblem(error).code === 'conflict') {
        await readAgain();
        setMine(body);
      }
      throw error;
    }
  };
  return (
    <Form
      schema={issueSpecification.body}
      defaultValues={{
        afterIssue: from.issue,
        note: '',
        specification: from.specification,
        requirements: from.requirements,
      }}
      submitLabel={
        overtaken ? `Issue mine after ${String(latest.issue)}` : `Make issue ${String(from.issue + 1)}`
      }
      onSubmit={submit}
      actions={<Button onClick={onDone}>Cancel</Button>}
    >
      <SpecificationInputs />
      <RequirementsEditor />
      <FormText name="note" label="What changes, and why" hint="Kept with the issue." />
      {overtaken && <Overtaken from={from} theirs={latest} mine={mine} />}
    </Form>
  );
}
