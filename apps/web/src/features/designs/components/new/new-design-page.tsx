import type { AirfoilSummary, Programme } from '@tipward/contract';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { PageHeader } from '../../../../components/ui/page-header.tsx';
import { Tabs } from '../../../../components/ui/tabs.tsx';
import { useProgramme } from '../../api/get-programme.ts';
import { useAirfoils } from '../../api/list-airfoils.ts';
import { START_KINDS } from '../../lib/start-defaults.ts';
import { StartFork } from './start-fork.tsx';
import { StartSized } from './start-sized.tsx';
import { StartStations } from './start-stations.tsx';

/** The three ways to begin; the one chosen stands in the address, the name typed is kept when switching. */
function Ways({ programme, airfoils }: { programme: Programme; airfoils: readonly AirfoilSummary[] }) {
  const [search, setSearch] = useSearchParams();
  const [name, onName] = useState('');
  const kind = START_KINDS.find((way) => way.kind === search.get('from'))?.kind ?? 'sized';
  const given = { programme, airfoils, name, onName };
  const contents = {
    sized: <StartSized {...given} />,
    stations: <StartStations {...given} />,
    fork: <StartFork {...given} versionId={search.get('version')} />,
  };
  return (
    <Tabs
      label="How the design begins"
      value={kind}
      onChange={(from) => {
        setSearch({ from }, { replace: true });
      }}
      tabs={START_KINDS.map((way) => ({ id: way.kind, label: way.label, content: contents[way.kind] }))}
    />
  );
}

export function NewDesignPage({ programmeId }: { programmeId: string }) {
  const programme = useProgramme(programmeId);
  const airfoils = useAirfoils();
  return (
    <div className="mx-auto max-w-3xl">
      <Loaded query={programme} what="the programme">
        {(data) => (
          <>
            <PageHeader
              title="New design"
              trail={[
                { label: 'Programmes', to: '/' },
                { label: data.name, to: `/programmes/${data.id}` },
              ]}
              meta={`It begins as a private draft under specification issue ${String(data.latestIssue)}.`}
            />
            {data.abilities.createDesign ? (
              <Loaded query={airfoils} what="the airfoils">
                {({ items }) => <Ways programme={data} airfoils={items} />}
              </Loaded>
            ) : (
              <EmptyState title="Only an aerodynamicist or a lead of the programme starts designs." />
            )}
          </>
        )}
      </Loaded>
    </div>
  );
}
