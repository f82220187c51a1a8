import type { Evaluation, Warning } from '@tipward/contract';
import type { LiveResult } from '@tipward/design-model';
import { useMemo, useState } from 'react';
import { CurvePlot } from '../../../components/plots/curve-plot.tsx';
import type { PlotLimit } from '../../../components/plots/plot-series.ts';
import type { Latest } from '../../../lib/solver/use-latest.ts';
import { useCursor } from '../hooks/use-cursors.ts';
import type { CursorStore } from '../lib/cursor-store.ts';
import type { HeadlineNumber } from '../lib/headline-numbers.ts';
import type { DrawnReference, RotorCoefficient } from '../lib/studio-series.ts';
import { curveSeries, maximumMark } from '../lib/studio-series.ts';
import { HeadlineTable } from './headline-table.tsx';
import { Pending } from './pending.tsx';
import { VerdictTable } from './verdict-table.tsx';
import { WarningList } from './warning-list.tsx';

export interface RotorColumnProps {
  readonly live: Latest<LiveResult>;
  readonly evaluation: Latest<Evaluation>;
  readonly reference: DrawnReference | null;
  readonly numbers: readonly HeadlineNumber[];
  /** How the comparison is not like for like; empty when it is. */
  readonly unlike: readonly string[];
  readonly warnings: readonly Warning[];
  readonly designTipSpeedRatio: number;
  readonly stationRadiiM: readonly number[];
  readonly cursors: CursorStore;
  /** What is said over results that are not current. */
  readonly pendingReason: string;
}

const COEFFICIENTS: Record<RotorCoefficient, { title: string; short: string }> = {
  cp: { title: 'Power coefficient', short: 'CP' },
  ct: { title: 'Thrust coefficient', short: 'CT' },
};
const NO_LIMITS: readonly PlotLimit[] = [];

function CoefficientChoice({
  value,
  onChoose,
}: {
  value: RotorCoefficient;
  onChoose: (value: RotorCoefficient) => void;
}) {
  return (
    <span role="group" aria-label="Coefficient over λ" className="flex print:hidden">
      {(['cp', 'ct'] as const).map((coefficient) => (
        <button
          key={coefficient}
          type="button"
          aria-pressed={value === coefficient}
          onClick={() => {
            onChoose(coefficient);
          }}
          className="h-6 cursor-pointer border border-rule bg-sheet px-2 text-xs text-ink-soft first:border-r-0 aria-pressed:bg-ink aria-pressed:text-paper"
        >
          {COEFFICIENTS[coefficient].short}
        </button>
      ))}
    </span>
  );
}

function RotorCurve({
  live,
  reference,
  designTipSpeedRatio,
  cursors,
}: {
  live: LiveResult;
  reference: DrawnReference | null;
  designTipSpeedRatio: number;
  cursors: CursorStore;
}) {
  const [coefficient, setCoefficient] = useState<RotorCoefficient>('cp');
  const picked = useCursor(cursors, (held) => held.tipSpeedRatio);
  const series = useMemo(() => curveSeries(coefficient, live, reference), [coefficient, live, reference]);
  const marks = useMemo(() => maximumMark(coefficient, live), [coefficient, live]);
  const domain = useMemo((): [number, number] => {
    const ratios = live.curve.tipSpeedRatio;
    return [ratios[0] ?? 1, ratios.at(-1) ?? 12];
  }, [live]);
  return (
    <CurvePlot
      title={COEFFICIENTS[coefficient].title}
      unit=""
      quantity={coefficient}
      xTitle="Tip-speed ratio λ"
      xUnit=""
      xQuantity="lambda"
      xSymbol="λ"
      series={series}
      cursorX={picked ?? designTipSpeedRatio}
      onCursor={cursors.setTipSpeedRatio}
      step={0.05}
      marks={marks}
      limits={NO_LIMITS}
      xDomain={domain}
      height={264}
      heading={<CoefficientChoice value={coefficient} onChoose={setCoefficient} />}
      {...(reference === null ? {} : { differenceBaseId: 'reference' })}
    />
  );
}

/** What the rotor does: Cp over λ, the numbers an edit is judged by, the verdicts and the warnings. */
export function RotorColumn(props: RotorColumnProps) {
  const {
    live,
    evaluation,
    reference,
    numbers,
    unlike,
    warnings,
    designTipSpeedRatio,
    cursors,
    pendingReason,
  } = props;
  return (
    <section aria-label="Rotor" className="flex min-h-0 min-w-0 flex-col gap-2">
      {live.output !== null && (
        <Pending current={live.current} reason={pendingReason}>
          <RotorCurve
            live={live.output}
            reference={reference}
            designTipSpeedRatio={designTipSpeedRatio}
            cursors={cursors}
          />
        </Pending>
      )}
      <HeadlineTable numbers={numbers} referenceLabel={reference?.label ?? null} unlike={unlike} />
      <div className="min-h-32 flex-1 overflow-auto">
        <VerdictTable evaluation={evaluation} pendingReason={pendingReason} cursors={cursors} />
        {live.output !== null && (
          <WarningList
            warnings={warnings}
            current={live.current}
            stationRadiiM={props.stationRadiiM}
            cursors={cursors}
          />
        )}
      </div>
    </section>
  );
}
