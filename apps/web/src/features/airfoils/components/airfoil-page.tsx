import { formatQuantity } from '@tipward/design-model';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { useAirfoil } from '../api/get-airfoil.ts';
import { OutlinePlot } from './outline-plot.tsx';
import { PolarPlots } from './polar-plots.tsx';
import { PolarTable } from './polar-table.tsx';

/** Can I trust this polar? */
export function AirfoilPage({ airfoilId }: { airfoilId: string }) {
  const airfoil = useAirfoil(airfoilId);
  return (
    <Loaded query={airfoil} what="the airfoil">
      {(data) => (
        <>
          <PageHeader
            title={data.name}
            trail={[{ label: 'Airfoils', to: '/airfoils' }]}
            meta={
              <>
                <span className="block max-w-prose wrap-anywhere text-ink">{data.note}</span>
                Relative thickness{' '}
                <span className="figures">{formatQuantity('thicknessPct', data.thicknessPct)}</span> %, added
                by {data.addedBy.name} <Moment at={data.addedAt} />. Polar set{' '}
                <span className="figures" title={data.polarSetHash}>
                  {data.polarSetHash.slice(0, 12)}…
                </span>
              </>
            }
          />
          <Section title="Polars">
            <PolarTable airfoil={data} />
          </Section>
          <div className="grid grid-cols-[minmax(0,1fr)] gap-x-10 xl:grid-cols-[minmax(0,2fr)_minmax(0,3fr)]">
            <Section title="Outline">
              <OutlinePlot airfoil={data} />
            </Section>
            <Section title="Coefficients">
              <PolarPlots airfoil={data} />
            </Section>
          </div>
        </>
      )}
    </Loaded>
  );
}
