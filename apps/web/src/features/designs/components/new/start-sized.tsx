import { FieldGrid } from '../../../../components/ui/form/field-grid.tsx';
import { FieldSet } from '../../../../components/ui/form/field-set.tsx';
import { FormNumber } from '../../../../components/ui/form/form-fields.tsx';
import { sizedDefaults } from '../../lib/start-defaults.ts';
import { AirfoilChoice } from './airfoil-choice.tsx';
import { StartForm } from './start-form.tsx';
import type { StartGiven } from './start-form.tsx';

/** The optimum planform with wake rotation (Schmitz, Glauert), held under a chord cap. */
export function StartSized(given: StartGiven) {
  const all = given.airfoils.map(({ id }) => id);
  return (
    <StartForm {...given} start={sizedDefaults(given.programme, all)}>
      <FieldSet
        legend="Sizing"
        hint="Optimum planform with wake rotation (Schmitz), smoothed at root and cap."
      >
        <FieldGrid>
          <FormNumber
            name="start.tipSpeedRatio"
            label="Design tip-speed ratio"
            hint="From the specification."
          />
          <FormNumber
            name="start.designLift"
            label="Design lift coefficient"
            hint="Less lift widens the blade and keeps it further from stall."
          />
          <FormNumber
            name="start.maxChordM"
            label="Chord cap"
            unit="m"
            optional
            hint="Mould or transport. Begins at the requirement, where there is one."
          />
          <FormNumber
            name="start.stationCount"
            label="Stations"
            hint="5 to 60; you may add and take away later."
          />
        </FieldGrid>
      </FieldSet>
      <AirfoilChoice airfoils={given.airfoils} />
    </StartForm>
  );
}
