import type { AirfoilSummary } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { Checkbox } from '../../../../components/ui/checkbox.tsx';
import { FieldSet } from '../../../../components/ui/form/field-set.tsx';
import { useField } from '../../../../components/ui/form/use-field.ts';

/** Airfoils the design is to use; between them stations are blended by relative thickness. */
export function AirfoilChoice({ airfoils }: { airfoils: readonly AirfoilSummary[] }) {
  const { error, ...field } = useField('start.airfoilIds');
  return (
    <FieldSet legend="Airfoils" hint="Stations between them are blended by relative thickness.">
      <div className="grid grid-cols-[repeat(auto-fill,minmax(13rem,1fr))] gap-x-6 gap-y-2">
        {airfoils
          .toSorted((a, b) => a.thicknessPct - b.thicknessPct)
          .map((airfoil) => (
            <Checkbox
              key={airfoil.id}
              {...field}
              value={airfoil.id}
              label={
                <>
                  {airfoil.name}{' '}
                  <span className="figures text-[13px] text-ink-soft">
                    {formatQuantity('thicknessPct', airfoil.thicknessPct)} %
                  </span>
                </>
              }
            />
          ))}
      </div>
      {airfoils.length === 0 && <p className="m-0 text-ink-soft">The library holds no airfoil yet.</p>}
      {error !== undefined && (
        <p className="m-0 mt-2 text-[13px] text-fails">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      )}
    </FieldSet>
  );
}
