import { REQUIREMENT_KINDS } from '@tipward/contract';
import type { Requirement, RequirementKind } from '@tipward/contract';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../../../components/ui/button.tsx';
import { FieldSet } from '../../../../components/ui/form/field-set.tsx';
import { FormNumber, FormSelect, FormText } from '../../../../components/ui/form/form-fields.tsx';

const KINDS = (Object.keys(REQUIREMENT_KINDS) as RequirementKind[]).map((value) => ({
  value,
  label: REQUIREMENT_KINDS[value].label,
}));

interface Holder {
  requirements: Requirement[];
}

function Row({ index, onRemove }: { index: number; onRemove: () => void }) {
  const { watch } = useFormContext<Holder>();
  const kind = REQUIREMENT_KINDS[watch(`requirements.${index}.kind`)];
  return (
    <li className="grid grid-cols-1 items-start gap-x-4 gap-y-2 border-b border-rule py-3 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_minmax(0,2fr)_auto]">
      <FormSelect name={`requirements.${String(index)}.kind`} label="Requirement" options={KINDS} />
      <FormNumber
        name={`requirements.${String(index)}.limit`}
        label={kind.bound === 'upper' ? 'At most' : 'At least'}
        unit={kind.unit}
      />
      <FormText
        name={`requirements.${String(index)}.reason`}
        label="Reason"
        placeholder="mould, road transport, foundation …"
      />
      <Button
        kind="quiet"
        className="justify-self-start sm:mt-6"
        aria-label={`Remove requirement ${String(index + 1)}: ${kind.label}`}
        onClick={onRemove}
      >
        Remove
      </Button>
    </li>
  );
}

/** The limits a result is held against; one of a kind, each with the reason it stands there for. */
export function RequirementsEditor() {
  const { control, getValues } = useFormContext<Holder>();
  const { fields, append, remove } = useFieldArray({ control, name: 'requirements' });
  const add = () => {
    const taken = getValues('requirements').map(({ kind }) => kind);
    const free = KINDS.find(({ value }) => !taken.includes(value)) ?? KINDS[0];
    // The limit is left empty on purpose: no number here may come from us.
    if (free !== undefined)
      append({ kind: free.value, reason: '' } as unknown as Requirement, {
        focusName: `requirements.${String(fields.length)}.kind`,
      });
  };
  return (
    <FieldSet legend="Requirements" hint="Every version is held against them.">
      <ul className="m-0 list-none p-0">
        {fields.map((field, index) => (
          <Row
            key={field.id}
            index={index}
            onRemove={() => {
              remove(index);
            }}
          />
        ))}
      </ul>
      {fields.length === 0 && (
        <p className="m-0 py-2 text-ink-soft">None yet: nothing would be held or fail.</p>
      )}
      {fields.length < KINDS.length && (
        <Button className="mt-3" onClick={add}>
          Add a requirement
        </Button>
      )}
    </FieldSet>
  );
}
