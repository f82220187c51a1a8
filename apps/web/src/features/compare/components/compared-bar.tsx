import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { seriesColor } from '../../../components/plots/plot-series.ts';
import type { ComparedItem } from '../api/compared-items.ts';
import { useChoices } from '../api/list-choices.ts';
import type { Selection } from '../lib/selection.ts';
import { MOST_COMPARED, without } from '../lib/selection.ts';

interface Props {
  readonly selection: Selection;
  readonly items: readonly ComparedItem[];
  readonly onChange: (selection: Selection) => void;
}

function Swatch({ index, dashed }: { index: number; dashed: boolean }) {
  return (
    <svg width="28" height="8" aria-hidden="true">
      <line
        x1="0"
        x2="28"
        y1="4"
        y2="4"
        stroke={seriesColor(index)}
        strokeWidth="2"
        {...(dashed ? { strokeDasharray: '6 4' } : {})}
      />
    </svg>
  );
}

/** What is compared, which is the reference, and what else could be. */
export function ComparedBar({ selection, items, onChange }: Props) {
  const choices = useChoices(items[0]?.programmeId ?? null).filter(
    (choice) => !selection.items.some((item) => item.id === choice.id),
  );
  return (
    <div className="mb-6">
      <ul className="m-0 list-none p-0">
        {items.map((item) => {
          const isBase = item.id === selection.baseId;
          return (
            <li key={item.id} className="flex flex-wrap items-center gap-3 border-t border-rule py-1">
              <Swatch index={selection.items.findIndex((each) => each.id === item.id)} dashed={isBase} />
              <Link className="link min-w-0 flex-1 wrap-anywhere" to={item.link}>
                {item.title}
              </Link>
              {isBase ? (
                <span className="text-[13px] text-ink-soft">reference</span>
              ) : (
                <Button
                  small
                  kind="quiet"
                  onClick={() => {
                    onChange({ ...selection, baseId: item.id });
                  }}
                >
                  Make {item.label} the reference
                </Button>
              )}
              <Button
                small
                kind="quiet"
                aria-label={`Take ${item.label} out`}
                onClick={() => {
                  onChange(without(selection, item.id));
                }}
              >
                Take out
              </Button>
            </li>
          );
        })}
      </ul>
      {selection.items.length < MOST_COMPARED && choices.length > 0 && (
        <div className="no-print mt-2 max-w-md">
          <Select
            label="Add a version or draft"
            value=""
            onChange={(event) => {
              const choice = choices.find((each) => each.id === event.target.value);
              if (choice !== undefined)
                onChange({ ...selection, items: [...selection.items, { kind: choice.kind, id: choice.id }] });
            }}
            options={[
              { value: '', label: 'choose …' },
              ...choices.map((choice) => ({ value: choice.id, label: choice.label })),
            ]}
          />
        </div>
      )}
    </div>
  );
}
