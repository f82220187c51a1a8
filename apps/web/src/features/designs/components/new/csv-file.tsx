import { useState } from 'react';
import { Field } from '../../../../components/ui/field.tsx';

/** 200 stations are a few kilobytes; anything this large is another file. */
const MOST_BYTES = 1_000_000;

/** Reads a CSV or text file into the block beneath. */
export function CsvFile({ onText }: { onText: (text: string) => void }) {
  const [fault, setFault] = useState<string | undefined>();
  const read = async (file: File | undefined) => {
    if (file === undefined) return;
    if (file.size > MOST_BYTES) {
      setFault(
        `${file.name} has ${String(Math.round(file.size / 1000))} kB; allowed: at most 1000 kB of text`,
      );
      return;
    }
    try {
      onText(new TextDecoder('utf-8', { fatal: true }).decode(await file.arrayBuffer()));
      setFault(undefined);
    } catch {
      setFault(`${file.name} is not text; allowed: CSV or text in UTF-8`);
    }
  };
  return (
    <Field label="CSV file" optional error={fault} hint="Its text is put into the field beneath.">
      {(control) => (
        <input
          {...control}
          type="file"
          accept=".csv,.tsv,.txt,text/csv,text/plain"
          className="control file:mr-3 file:cursor-pointer file:rounded-xs file:border file:border-solid file:border-rule-strong file:bg-panel file:px-2 file:text-ink"
          onChange={(event) => void read(event.target.files?.[0])}
        />
      )}
    </Field>
  );
}
