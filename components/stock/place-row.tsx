'use client';
import Link from 'next/link';

import { useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { Cell, Row } from '@/components/ui/table';
import type { ApiError } from '@/lib/api/client';
import { closeLocation, listLocations, reopenLocation, type Location } from '@/lib/stock/contract';

const REFRESHED = { refreshes: [listLocations] };

/** One place, with how much lies in it. An empty one can be closed, a closed one opened again. */
export function PlaceRow({ place }: { place: Location }) {
  return (
    <Row state={place.closed ? 'off' : 'rest'}>
      <Cell strong className="[overflow-wrap:anywhere]">
        <Link href={`/stock?place=${place.id}`}>{place.name}</Link>
        {place.closed && <span className="font-normal text-quiet"> closed</span>}
      </Cell>
      <Cell figure>{place.pieces > 0 ? place.pieces.toLocaleString('en-US') : ''}</Cell>
      <Cell right>
        <PlaceAction place={place} />
      </Cell>
    </Row>
  );
}

function PlaceAction({ place: { id: locationId, name, pieces, closed } }: { place: Location }) {
  const may = useMay('stock.release');
  const close = useWrite(closeLocation, REFRESHED);
  const reopen = useWrite(reopenLocation, REFRESHED);
  if (!may || pieces > 0) return null;

  const open = () =>
    reopen.mutateAsync({ locationId }).then(() => showMessage({ says: `${name} is open again.` }), failed);
  const shut = () =>
    close
      .mutateAsync({ locationId })
      .then(() => showMessage({ says: `${name} is closed.`, action: { says: 'Undo', run: open } }), failed);
  return (
    <Button look="word" onClick={closed ? open : shut}>
      {closed ? 'Open again' : 'Close'}
      <span className="sr-only"> {name}</span>
    </Button>
  );
}

const failed = (error: ApiError) => showMessage({ says: error.message, failed: true });
