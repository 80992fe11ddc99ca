'use client';
import { useRead } from '@/components/api/use-api';
import { Segments } from '@/components/ui/segments';
import type { Role } from '@/lib/auth/roles';
import { getTideline } from '@/lib/tideline/contract';
import { whatWaits } from '@/lib/tideline/what-waits';

import { AssemblyWaits } from './assembly-waits';
import { FirstDay } from './first-day';
import { PhoneTideline } from './phone-tideline';
import { Summary } from './summary';
import { TidelineList } from './tideline-list';
import { TidelinePlot } from './tideline-plot';
import { WaitsForMe } from './waits-for-me';

export type TidelineView = 'lanes' | 'list';

/** The first screen: where every batch is in time, and under it what can be done about it. */
export function TidelineScreen({ roles, view }: { roles: readonly Role[]; view: TidelineView }) {
  const { data: tideline } = useRead(getTideline, {});
  const waiting = whatWaits(tideline, roles);
  if (tideline.started.batches === 0) return <FirstDay tideline={tideline} roles={roles} />;
  return (
    <>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-2 pt-4 pb-3">
        <div className="mr-auto">
          <h1>Tideline</h1>
          <Summary tideline={tideline} />
        </div>
        <div className="max-md:hidden">
          <Segments
            label="How to show it"
            items={[
              { says: 'on the line', href: '/', current: view === 'lanes' },
              { says: 'as a list', href: '/?view=list', current: view === 'list' },
            ]}
          />
        </div>
        <a
          data-key="v"
          data-key-says={view === 'list' ? 'on the line' : 'as a list'}
          href={view === 'list' ? '/' : '/?view=list'}
          className="sr-only"
        >
          {view === 'list' ? 'Show on the line' : 'Show as a list'}
        </a>
      </div>
      <div className="max-md:hidden">
        {view === 'list' ? <TidelineList tideline={tideline} /> : <TidelinePlot tideline={tideline} />}
      </div>
      <div className="md:hidden">
        <PhoneTideline tideline={tideline} />
      </div>
      <div className="mt-4 grid grid-cols-1 gap-9 lg:grid-cols-[minmax(0,728fr)_minmax(0,512fr)]">
        <WaitsForMe waiting={waiting} />
        <AssemblyWaits tideline={tideline} />
      </div>
    </>
  );
}
