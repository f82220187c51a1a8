import type {
  AirfoilSummary,
  DraftContent,
  Fault,
  SolverSettings,
  SpecificationIssue,
} from '@tipward/contract';
import { readNumber } from '@tipward/design-model';
import type { Dispatch } from 'react';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { NumberInput } from '../../../components/ui/number-input.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { StudioAction } from '../lib/studio-reducer.ts';
import { AirfoilSettings } from './airfoil-settings.tsx';

export interface SettingsPanelProps {
  readonly content: DraftContent;
  readonly dispatch: Dispatch<StudioAction>;
  readonly faults: readonly Fault[];
  readonly issues: readonly SpecificationIssue[];
  readonly library: readonly AirfoilSummary[];
}

type RotorNumber = 'pitchDeg' | 'designTipSpeedRatio';
const HIGH_INDUCTION = [
  { value: 'buhl', label: 'Buhl 2005' },
  { value: 'glauert', label: 'Glauert’s empirical curve' },
  { value: 'straight-tangent', label: 'Straight tangent at a = 0.4' },
] as const;
const SURFACE = [
  { value: 'clean', label: 'Clean' },
  { value: 'soiled', label: 'Soiled' },
] as const;

const numberOf = (text: string): number | string => readNumber(text).value ?? text.slice(0, 200);

/** What the design is solved with: pitch, tip-speed ratio, corrections, surface, specification issue, airfoils. */
export function SettingsPanel({ content, dispatch, faults, issues, library }: SettingsPanelProps) {
  const faultOf = (field: string) => faults.find((fault) => fault.field === field)?.message;
  const setRotor = (field: RotorNumber, label: string, text: string) => {
    dispatch({
      type: 'change',
      label,
      mergeKey: `setting-${field}`,
      change: (before) => ({ ...before, [field]: numberOf(text) }),
    });
  };
  const set = (label: string, change: Partial<SolverSettings>) => {
    dispatch({
      type: 'change',
      label,
      change: (before) => ({ ...before, settings: { ...before.settings, ...change } }),
    });
  };
  const { settings } = content;
  return (
    <div className="flex flex-col gap-4 overflow-auto pr-2 pb-4">
      <div className="grid grid-cols-2 gap-3">
        <NumberInput
          label="Pitch"
          unit="°"
          value={String(content.pitchDeg)}
          error={faultOf('pitchDeg')}
          onChange={(event) => {
            setRotor('pitchDeg', 'Pitch', event.target.value);
          }}
        />
        <NumberInput
          label="Design tip-speed ratio"
          value={String(content.designTipSpeedRatio)}
          error={faultOf('designTipSpeedRatio')}
          onChange={(event) => {
            setRotor('designTipSpeedRatio', 'Design tip-speed ratio', event.target.value);
          }}
        />
        <Select
          label="Surface state"
          options={SURFACE}
          value={settings.surfaceState}
          onChange={(event) => {
            set('Surface state', { surfaceState: event.target.value === 'soiled' ? 'soiled' : 'clean' });
          }}
        />
        <Select
          label="Specification issue"
          options={issues.map((issue) => ({ value: String(issue.issue), label: `Issue ${issue.issue}` }))}
          value={String(content.specificationIssue)}
          error={faultOf('specificationIssue')}
          onChange={(event) => {
            const issue = Number(event.target.value);
            dispatch({
              type: 'change',
              label: `Specification issue ${issue}`,
              change: (before) => ({ ...before, specificationIssue: issue }),
            });
          }}
        />
        <Select
          label="High-induction relation"
          options={HIGH_INDUCTION}
          value={settings.highInduction}
          onChange={(event) => {
            const chosen = HIGH_INDUCTION.find((each) => each.value === event.target.value);
            if (chosen !== undefined) set('High-induction relation', { highInduction: chosen.value });
          }}
        />
        <ElementsInput elements={settings.elements} onSet={(elements) => set('Elements', { elements })} />
      </div>
      <fieldset className="m-0 flex flex-col gap-1 border-0 p-0">
        <legend className="mb-1 p-0 font-medium">Corrections</legend>
        {(
          [
            ['tipLoss', 'Tip loss (Prandtl)'],
            ['hubLoss', 'Hub loss (Prandtl)'],
            ['dragInInduction', 'Drag in the inductions'],
          ] as const
        ).map(([key, label]) => (
          <Checkbox
            key={key}
            label={label}
            checked={settings[key]}
            onChange={(event) => {
              set(label, { [key]: event.target.checked });
            }}
          />
        ))}
      </fieldset>
      <AirfoilSettings content={content} dispatch={dispatch} library={library} />
    </div>
  );
}

const ELEMENT_COUNTS = [20, 30, 40, 50, 60, 80, 100, 150, 200];

function ElementsInput({ elements, onSet }: { elements: number; onSet: (elements: number) => void }) {
  const counts = [...new Set([...ELEMENT_COUNTS, elements])].sort((a, b) => a - b);
  return (
    <Select
      label="Elements"
      options={counts.map((count) => ({ value: String(count), label: String(count) }))}
      value={String(elements)}
      onChange={(event) => {
        onSet(Number(event.target.value));
      }}
    />
  );
}
