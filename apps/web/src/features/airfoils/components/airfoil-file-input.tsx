import { Field } from '../../../components/ui/field.tsx';

export function AirfoilFileInput({ onText }: { onText: (text: string) => void }) {
  return (
    <Field label="JSON file" optional hint="Its text is put into the field beneath.">
      {(control) => (
        <input
          {...control}
          type="file"
          accept=".json,application/json"
          className="control file:mr-3 file:cursor-pointer file:rounded-xs file:border file:border-solid file:border-rule-strong file:bg-panel file:px-2 file:text-ink"
          onChange={(event) => void event.target.files?.[0]?.text().then(onText)}
        />
      )}
    </Field>
  );
}
