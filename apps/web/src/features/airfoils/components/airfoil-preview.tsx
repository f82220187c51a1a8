import type { AirfoilInput } from '@tipward/contract';
import { VerdictMark } from '../../../components/ui/verdict-mark.tsx';
import { polarFacts } from '../lib/polar-facts.ts';
import { polarName } from '../lib/polar-series.ts';
import { OutlinePlot } from './outline-plot.tsx';

/** What is about to be added for good. */
export function AirfoilPreview({ airfoil }: { airfoil: AirfoilInput }) {
  return (
    <div className="border-y border-rule py-3">
      <p className="m-0 mb-2 font-medium">
        {airfoil.name}, {airfoil.thicknessPct} %
      </p>
      <OutlinePlot airfoil={airfoil} />
      <ul className="m-0 mt-2 list-none p-0">
        {airfoil.polars.map((polar, i) => {
          const { concerns } = polarFacts(polar, airfoil.thicknessPct);
          return (
            <li key={i} className="flex flex-wrap gap-x-3">
              {polarName(polar)}, {polar.alphaDeg.length} angles
              {concerns.length === 0 ? (
                <VerdictMark verdict="holds" word="nothing to look at" />
              ) : (
                <span className="text-look">▲ {concerns.join(' ')}</span>
              )}
            </li>
          );
        })}
      </ul>
    </div>
  );
}
