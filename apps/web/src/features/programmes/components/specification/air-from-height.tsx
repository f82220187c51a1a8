import { readNumber } from '@tipward/design-model';
import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from '../../../../components/ui/button.tsx';
import { FieldGrid } from '../../../../components/ui/form/field-grid.tsx';
import { NumberInput } from '../../../../components/ui/number-input.tsx';
import { airAt } from '../../lib/new-specification.ts';

/** Fills density and viscosity from height and temperature of the site. */
export function AirFromHeight() {
  const { setValue } = useFormContext();
  const [height, setHeight] = useState('0');
  const [temperature, setTemperature] = useState('');
  const [fault, setFault] = useState<string | undefined>();
  const apply = () => {
    const heightM = readNumber(height).value;
    const temperatureC = temperature.trim() === '' ? null : readNumber(temperature).value;
    const unread = heightM === null || (temperatureC === null && temperature.trim() !== '');
    const air = unread ? null : airAt(heightM, temperatureC);
    setFault(
      air === null
        ? 'Allowed: a height of −1000 to 11000 m, a temperature within 80 °C of the standard.'
        : undefined,
    );
    if (air === null) return;
    setValue('specification.airDensityKgM3', air.airDensityKgM3, { shouldValidate: true });
    setValue('specification.airViscosityPaS', air.airViscosityPaS, { shouldValidate: true });
  };
  return (
    <details className="mt-3">
      <summary className="link w-fit cursor-pointer">From height and temperature of the site</summary>
      <div className="mt-3 flex flex-col items-start gap-3">
        <FieldGrid>
          <NumberInput
            label="Height above sea level"
            unit="m"
            value={height}
            error={fault}
            onChange={(event) => {
              setHeight(event.target.value);
            }}
          />
          <NumberInput
            label="Temperature"
            unit="°C"
            optional
            value={temperature}
            hint="Empty: that of the standard atmosphere (ISO 2533)."
            onChange={(event) => {
              setTemperature(event.target.value);
            }}
          />
        </FieldGrid>
        <Button onClick={apply}>Set density and viscosity</Button>
      </div>
    </details>
  );
}
