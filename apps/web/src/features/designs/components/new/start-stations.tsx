import { useField } from '../../../../components/ui/form/use-field.ts';
import { parseStationBlock } from '@tipward/design-model';
import type { StationBlock } from '@tipward/design-model';
import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { Textarea } from '../../../../components/ui/textarea.tsx';
import { AirfoilChoice } from './airfoil-choice.tsx';
import { CsvFile } from './csv-file.tsx';
import { StartForm } from './start-form.tsx';
import type { StartGiven } from './start-form.tsx';
import { StationPreview } from './station-preview.tsx';

/** What was pasted or read from a file, and how it is understood; the form takes the rows, bad cells included. */
function StationsInput({ airfoilNames }: { airfoilNames: readonly string[] }) {
  const { setValue, clearErrors } = useFormContext();
  const { error } = useField('start.stations');
  const [text, setText] = useState('');
  const [block, setBlock] = useState<StationBlock | null>(null);
  const read = (given: string) => {
    const parsed = given.trim() === '' ? null : parseStationBlock(given);
    setText(given);
    setBlock(parsed);
    setValue('start.stations', parsed?.rows ?? []);
    clearErrors('start.stations');
  };
  return (
    <>
      <CsvFile onText={read} />
      <Textarea
        label="Stations"
        figures
        rows={8}
        value={text}
        error={error}
        spellCheck={false}
        hint="Copy the block in the spreadsheet and paste it here. Columns: radius (m), chord (m), twist (°), relative thickness (%), airfoil; a header row may name them in another order. Numbers with a decimal point."
        onChange={(event) => {
          read(event.target.value);
        }}
      />
      {block !== null && <StationPreview block={block} airfoilNames={airfoilNames} />}
    </>
  );
}

export function StartStations(given: StartGiven) {
  const { airfoils } = given;
  return (
    <StartForm
      {...given}
      start={{ kind: 'stations', airfoilIds: airfoils.map(({ id }) => id), stations: [] }}
    >
      <StationsInput airfoilNames={airfoils.map(({ name }) => name)} />
      <AirfoilChoice airfoils={airfoils} />
    </StartForm>
  );
}
