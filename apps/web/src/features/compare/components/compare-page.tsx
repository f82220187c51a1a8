import { diffContents, likeForLike, summariseChange } from '@tipward/design-model';
import { useSearchParams } from 'react-router-dom';
import { KeyNumberTable } from '../../../components/record/key-number-table.tsx';
import { CoefficientPlot, WindPlots } from '../../../components/record/rotor-plots.tsx';
import { SpanPlots } from '../../../components/record/span-plots.tsx';
import { StationList } from '../../../components/record/station-list.tsx';
import { useUrlCursors } from '../../../components/record/use-url-cursors.ts';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Loading } from '../../../components/ui/loading.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { Section } from '../../../components/ui/section.tsx';
import type { ComparedItem } from '../api/compared-items.ts';
import { useComparedItems } from '../api/compared-items.ts';
import type { Selection } from '../lib/selection.ts';
import { readSelection, writeSelection } from '../lib/selection.ts';
import { ComparedBar } from './compared-bar.tsx';

function LikeForLike({ items }: { items: readonly ComparedItem[] }) {
  const differences = likeForLike(items);
  if (differences.length === 0)
    return (
      <p className="mt-0 text-[13px] text-holds">
        Like for like: same specification issue, polars, corrections and solver.
      </p>
    );
  return (
    <div role="note" className="mb-6 border-l-4 border-look bg-look-wash p-3">
      <strong>Not like for like.</strong> The numbers differ for more than the blade:
      <ul className="m-0 pl-5">
        {differences.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    </div>
  );
}

function Differences({ base, item }: { base: ComparedItem; item: ComparedItem }) {
  const { settings, inputs } = diffContents(base.content, item.content);
  const fields = [...settings, ...inputs];
  return (
    <Section title={`${item.label} against ${base.label}`}>
      <ul className="mt-0 mb-3 pl-5">
        {summariseChange({ before: base, after: item }).map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      {fields.length > 0 && (
        <dl className="figures mt-0 mb-3 grid grid-cols-[auto_1fr] gap-x-4 text-[13px]">
          {fields.map((field) => (
            <div key={field.field} className="contents">
              <dt>{field.field}</dt>
              <dd className="m-0">
                {field.before} → {field.after}
              </dd>
            </div>
          ))}
        </dl>
      )}
      <StationList content={item.content} base={base.content} />
    </Section>
  );
}

function Body({ items, selection }: { items: readonly ComparedItem[]; selection: Selection }) {
  const cursors = useUrlCursors();
  const base = items.find((item) => item.id === selection.baseId) ?? items[0];
  if (base === undefined || items.length < 2)
    return (
      <EmptyState title="Two are needed to compare">
        Add another version or draft above, or tick two to six on the page of a design.
      </EmptyState>
    );
  const drawn = items.map((item) => ({
    ...item,
    colorIndex: selection.items.findIndex((each) => each.id === item.id),
  }));
  return (
    <>
      <LikeForLike items={items} />
      <div className="grid gap-x-8 lg:grid-cols-2">
        <Section title="Rotor">
          <CoefficientPlot
            items={drawn}
            baseId={base.id}
            tipSpeedRatio={cursors.tipSpeedRatio}
            onTipSpeedRatio={cursors.setTipSpeedRatio}
          />
        </Section>
        <Section title="Key numbers">
          <KeyNumberTable
            items={items.map((item) => ({ ...item, keyNumbers: item.evaluation.keyNumbers }))}
            baseId={base.id}
          />
        </Section>
      </div>
      <Section title="Along the span" note="each at its design tip-speed ratio">
        <SpanPlots
          items={drawn}
          baseId={base.id}
          cursorRadiusM={cursors.radiusM}
          onCursor={cursors.setRadius}
        />
      </Section>
      <Section title="Against wind speed">
        <WindPlots items={drawn} baseId={base.id} />
      </Section>
      <div className="grid gap-x-8 lg:grid-cols-2">
        {items
          .filter((item) => item.id !== base.id)
          .map((item) => (
            <Differences key={item.id} base={base} item={item} />
          ))}
      </div>
    </>
  );
}

/** What is different, where, and what is it worth? */
export function ComparePage() {
  const [params, setParams] = useSearchParams();
  const { selection, problem } = readSelection(params);
  const queries = useComparedItems(selection);
  const items = queries.flatMap((query) => query.data ?? []);
  const change = (next: Selection) => {
    setParams((before) => writeSelection(before, next), { replace: true, preventScrollReset: true });
  };
  return (
    <>
      <PageHeader
        title={items.length === 0 ? 'Compare' : `Compare ${items.map((item) => item.label).join(', ')}`}
        trail={[{ label: 'Programmes', to: '/' }]}
      />
      {problem !== null && (
        <p role="alert" className="mt-0 text-look">
          {problem}
        </p>
      )}
      {queries.map((query, i) =>
        query.error === null ? null : (
          <Problem
            key={selection.items[i]?.id}
            error={query.error}
            title="One of the compared could not be shown."
            onRetry={() => void query.refetch()}
          />
        ),
      )}
      <ComparedBar selection={selection} items={items} onChange={change} />
      {queries.some((query) => query.isPending) ? (
        <Loading what="the comparison" />
      ) : (
        <Body items={items} selection={selection} />
      )}
    </>
  );
}
