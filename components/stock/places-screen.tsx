'use client';
import { useRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Cell, Row, Table } from '@/components/ui/table';
import { listLocations } from '@/lib/stock/contract';

import { AddPlace } from './add-place';
import { PlaceRow } from './place-row';
import { StockSegments } from './stock-segments';

const COLUMNS = [
  { says: 'Place' },
  { says: 'Pieces', right: true },
  { says: 'What can be done', hidden: true },
];

/** Shelves, bins and racks by name, with how much lies in each. */
export function PlacesScreen() {
  const { data } = useRead(listLocations, {});
  const may = useMay('stock.release');
  const total = data.rows.reduce((sum, place) => sum + place.pieces, 0);
  return (
    <>
      <PageHead title="Places" cells={<StockSegments current="places" />} />
      {may && (
        <div className="pb-3">
          <AddPlace look="outlined" onAdded={(place) => showMessage({ says: `${place.name} is added.` })} />
        </div>
      )}
      {data.rows.length === 0 && (
        <Empty
          says="No place is named yet."
          comes="Released pieces lie in a shelf, bin or rack that has a name here."
        />
      )}
      {data.rows.length > 0 && (
        <Table label="Places" columns={COLUMNS} keep className="max-w-xl">
          {data.rows.map((place) => (
            <PlaceRow key={place.id} place={place} />
          ))}
          <Row state="sum">
            <Cell>All places</Cell>
            <Cell figure>{total.toLocaleString('en-US')}</Cell>
            <Cell />
          </Row>
        </Table>
      )}
    </>
  );
}
