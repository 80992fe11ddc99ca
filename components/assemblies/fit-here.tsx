'use client';
import Link from 'next/link';

import { useLazyRead } from '@/components/api/use-api';
import { FitForm } from '@/components/stock/fit-form';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import type { AssemblyNeedRow } from '@/lib/assemblies/contract';
import { getStockSpot } from '@/lib/stock/contract';

interface FitHereProps {
  spot: AssemblyNeedRow['stock'][number];
  assemblyId: string;
}

/** Pieces of one lot in one place, to be fitted to this assembly. */
export function FitHere({ spot, assemblyId }: FitHereProps) {
  const { data, error, isPending } = useLazyRead(getStockSpot, {
    lotId: spot.lotId,
    locationId: spot.locationId,
  });
  return (
    <div className="border-b border-rule py-2">
      <p className="pb-2">
        <Link href={`/lots/${spot.lotId}`} className="num font-semibold">
          {spot.lotNumber}
        </Link>
        , <span className="num">{spot.pieces}</span> in {spot.location}
      </p>
      {isPending && <Loading rows={1} label={`Loading ${spot.lotNumber}`} />}
      {error && <Failing says={`${spot.lotNumber} could not be read.`} again={error.message} />}
      {data && (
        <FitForm
          key={`${data.pieces} ${data.needs.map((need) => need.open).join()}`}
          lotId={spot.lotId}
          lotNumber={spot.lotNumber}
          locationId={spot.locationId}
          spot={data}
          onlyTo={assemblyId}
        />
      )}
    </div>
  );
}
