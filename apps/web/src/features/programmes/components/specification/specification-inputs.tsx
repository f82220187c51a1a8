import { allowedText, SPECIFICATION_RULES } from '@tipward/contract';
import type { Specification } from '@tipward/contract';
import { useFormContext } from 'react-hook-form';
import { FieldGrid } from '../../../../components/ui/form/field-grid.tsx';
import { FieldSet } from '../../../../components/ui/form/field-set.tsx';
import { FormNumber, FormSelect } from '../../../../components/ui/form/form-fields.tsx';
import {
  CLASS_MEAN_MS,
  CONTROL_WORDS,
  FIELD_GROUPS,
  OPTIONAL_FIELDS,
  WIND_CLASSES,
} from '../../lib/specification-fields.ts';
import type { NumberField } from '../../lib/specification-fields.ts';
import { AirFromHeight } from './air-from-height.tsx';

const CONTROLS = (Object.keys(CONTROL_WORDS) as Specification['control'][]).map((value) => ({
  value,
  label: CONTROL_WORDS[value],
}));

function NumberOf({ field }: { field: NumberField }) {
  const rule = SPECIFICATION_RULES[field];
  const emptyMeans = OPTIONAL_FIELDS[field];
  return (
    <FormNumber
      name={`specification.${field}`}
      label={rule.label}
      unit={rule.unit}
      optional={emptyMeans !== undefined}
      title={`Allowed: ${allowedText(rule)}`}
      hint={emptyMeans}
    />
  );
}

/** A class names its mean wind speed: choosing one sets it. */
function WindClass() {
  const { setValue } = useFormContext();
  return (
    <FormSelect
      name="specification.windClass"
      label="Wind class"
      options={WIND_CLASSES}
      hint="IEC 61400-1"
      onInput={(event) => {
        const mean = CLASS_MEAN_MS[event.currentTarget.value as Specification['windClass']];
        if (mean !== null) setValue('specification.meanWindSpeedMS', mean, { shouldValidate: true });
      }}
    />
  );
}

/** All numbers of a specification, in groups. */
export function SpecificationInputs() {
  return FIELD_GROUPS.map((group) => (
    <FieldSet key={group.title} legend={group.title}>
      <FieldGrid>
        {group.title === 'Control' && (
          <FormSelect name="specification.control" label="Control" options={CONTROLS} />
        )}
        {group.title === 'Wind' && <WindClass />}
        {group.fields.map((field) => (
          <NumberOf key={field} field={field} />
        ))}
      </FieldGrid>
      {group.title === 'Air' && <AirFromHeight />}
    </FieldSet>
  ));
}
