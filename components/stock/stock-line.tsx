'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Cell, Row } from '@/components/ui/table';
import { getStockSpot, type StockRow } from '@/lib/stock/contract';

import { FitForm } from './fit-form';
import { MoveForm } from './move-form';

interface StockLineProps {
  row: StockRow;
  span: number;
}

/** Pieces of one lot in one place; what can be done with them opens beneath. */
export function StockLine({ row, span }: StockLineProps) {
  const [open, setOpen] = useState(false);
  const openId = `open-${row.lotId}-${row.locationId}`;
  const [mayFit, mayMove] = [useMay('stock.fit'), useMay('stock.release')];
  return (
    <>
      <Row selected={open}>
        <Cell className="max-w-96">
          <Link href={`/parts/${row.partId}`} className="num font-semibold [overflow-wrap:anywhere]">
            {row.partNumber}
          </Link>{' '}
          <span className="whitespace-nowrap text-quiet">rev {row.partRevision}</span>{' '}
          <span className="font-cond">{row.partName}</span>
        </Cell>
        <Cell>
          <Link href={`/lots/${row.lotId}`} className="num font-semibold">
            {row.lotNumber}
          </Link>
        </Cell>
        <Cell head="Condition">{row.condition}</Cell>
        <Cell code head="Heat" className="[overflow-wrap:anywhere]">
          {row.heat}
        </Cell>
        <Cell head="Place" strong>
          {row.location}
        </Cell>
        <Cell figure head="Pieces">
          {row.pieces.toLocaleString('en-US')}
        </Cell>
        <Cell right>
          {(mayFit || mayMove) && (
            <Button look="word" aria-expanded={open} aria-controls={openId} onClick={() => setOpen(!open)}>
              {open ? 'Close' : openWords(mayFit, mayMove)}
              <span className="sr-only">
                {' '}
                {row.lotNumber} in {row.location}
              </span>
            </Button>
          )}
        </Cell>
      </Row>
      {open && (
        <tr role="row" id={openId}>
          <td role="cell" colSpan={span}>
            <OpenSpot row={row} mayFit={mayFit} mayMove={mayMove} />
          </td>
        </tr>
      )}
    </>
  );
}

function openWords(mayFit: boolean, mayMove: boolean): string {
  if (mayFit && mayMove) return 'Fit or move';
  return mayFit ? 'Fit' : 'Move';
}

interface OpenSpotProps {
  row: StockRow;
  mayFit: boolean;
  mayMove: boolean;
}

function OpenSpot({ row, mayFit, mayMove }: OpenSpotProps) {
  const { data, error, isPending } = useLazyRead(getStockSpot, {
    lotId: row.lotId,
    locationId: row.locationId,
  });
  if (isPending) return <Loading rows={2} label="Loading what needs it" />;
  if (error) return <Failing says="What can be done with it could not be read." again={error.message} />;
  const spot = { lotId: row.lotId, lotNumber: row.lotNumber, locationId: row.locationId, spot: data };
  // Read anew after a move, the forms begin anew: what was typed is done.
  const key = `${data.pieces} ${data.needs.map((need) => need.open).join()}`;
  return (
    <div className="grid grid-cols-1 gap-x-gutter gap-y-5 py-2 whitespace-normal lg:grid-cols-2">
      {mayFit && (
        <div>
          <h3 className="pb-1.5">Fit to an assembly</h3>
          <FitForm key={key} {...spot} />
        </div>
      )}
      {mayMove && (
        <div>
          <h3 className="pb-1.5">Move to another place</h3>
          <MoveForm key={key} {...spot} location={row.location} />
        </div>
      )}
    </div>
  );
}
