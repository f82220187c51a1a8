import type { AirfoilSummary, DraftContent } from '@tipward/contract';
import type { Dispatch } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import type { StudioAction } from '../lib/studio-reducer.ts';

/** The airfoils a design draws from: pinned with their polars' hash, so that they cannot change underneath. */
export function AirfoilSettings({
  content,
  dispatch,
  library,
}: {
  content: DraftContent;
  dispatch: Dispatch<StudioAction>;
  library: readonly AirfoilSummary[];
}) {
  const thickness = (airfoilId: string) => library.find((foil) => foil.id === airfoilId)?.thicknessPct;
  const free = library
    .filter((foil) => content.airfoils.every((pinned) => pinned.name !== foil.name))
    .toSorted((a, b) => a.thicknessPct - b.thicknessPct);
  const usedBy = (name: string) => content.stations.filter((station) => station.airfoil === name).length;
  const add = (foil: AirfoilSummary) => {
    dispatch({
      type: 'change',
      label: `Add airfoil ${foil.name}`,
      change: (before) => ({
        ...before,
        airfoils: [
          ...before.airfoils,
          { name: foil.name, airfoilId: foil.id, polarSetHash: foil.polarSetHash },
        ],
      }),
    });
  };
  const remove = (name: string) => {
    dispatch({
      type: 'change',
      label: `Remove airfoil ${name}`,
      change: (before) => ({ ...before, airfoils: before.airfoils.filter((foil) => foil.name !== name) }),
    });
  };
  return (
    <section aria-label="Airfoils of the design">
      <h2 className="m-0 mb-1 text-sm font-medium">Airfoils of the design</h2>
      <table className="w-full border-collapse text-[13px]">
        <thead className="text-left text-xs text-ink-soft">
          <tr>
            <th scope="col" className="font-normal">
              Airfoil
            </th>
            <th scope="col" className="text-right font-normal">
              t/c, %
            </th>
            <th scope="col" className="pl-3 font-normal">
              Polars
            </th>
            <th scope="col" className="text-right font-normal">
              Named at
            </th>
            <th scope="col">
              <span className="sr-only">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {content.airfoils.map((foil) => (
            <tr key={foil.name} className="border-t border-rule">
              <th scope="row" className="text-left font-normal">
                {foil.name}
              </th>
              <td className="figures text-right">{thickness(foil.airfoilId)?.toFixed(1) ?? '–'}</td>
              <td className="figures pl-3 text-xs text-ink-soft" title={foil.polarSetHash}>
                {foil.polarSetHash.slice(0, 8)}
              </td>
              <td className="text-right">
                {usedBy(foil.name) === 0 ? '–' : `${usedBy(foil.name)} stations`}
              </td>
              <td className="text-right">
                <Button
                  small
                  kind="quiet"
                  aria-label={`Remove ${foil.name}`}
                  onClick={() => {
                    remove(foil.name);
                  }}
                >
                  Remove
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {content.airfoils.length === 0 && (
        <p className="m-0 text-[13px] text-fails">No airfoil yet: nothing can be solved without one.</p>
      )}
      <label className="mt-2 flex items-center gap-2 text-[13px]">
        Add from the library
        <select
          className="control min-h-7 max-w-60"
          value=""
          onChange={(event) => {
            const foil = free.find((each) => each.id === event.target.value);
            if (foil !== undefined) add(foil);
          }}
        >
          <option value="">{free.length === 0 ? 'All are in the design' : 'Choose an airfoil …'}</option>
          {free.map((foil) => (
            <option key={foil.id} value={foil.id}>
              {`${foil.name}, ${foil.thicknessPct.toFixed(1)} %`}
            </option>
          ))}
        </select>
      </label>
    </section>
  );
}
