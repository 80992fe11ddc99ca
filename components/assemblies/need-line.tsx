'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { SteelRule } from '@/components/ui/steel-rule';
import { Cell, Row } from '@/components/ui/table';
import type { AssemblyNeedRow } from '@/lib/assemblies/contract';

import { FitHere } from './fit-here';
import { RestOnBatch, Words } from './rest-of';
import { readyOf, stillToMake, yardWords } from './rest-words';
import { TakeOut } from './take-out';

interface NeedLineProps {
  need: AssemblyNeedRow;
  assembly: { id: string; name: string; closed: boolean };
  span: number;
}

/** One part that is needed; its lots, in stock and fitted, open beneath. */
export function NeedLine({ need, assembly, span }: NeedLineProps) {
  const [open, setOpen] = useState(false);
  const mayFit = useMay('stock.fit') && !assembly.closed;
  const ready = readyOf(need);
  const isOpen = need.fitted < need.pieces;
  const canFit = mayFit && isOpen && need.stock.length > 0;
  const tick = Math.max(1, Math.ceil(need.pieces / 10));
  const openId = `lots-of-${need.partNumber}`;
  return (
    <>
      <Row selected={open}>
        <Cell className="max-w-80">
          {need.partId ? (
            <Link href={`/parts/${need.partId}`} className="num font-semibold [overflow-wrap:anywhere]">
              {need.partNumber}
            </Link>
          ) : (
            <span className="num font-semibold [overflow-wrap:anywhere]">{need.partNumber}</span>
          )}{' '}
          <span className="font-cond">
            {need.partName ?? <span className="text-dispatched-ink">no part has this number</span>}
          </span>
        </Cell>
        <Cell figure head="Needed">
          {need.pieces}
        </Cell>
        <Cell figure head="Fitted">
          {need.fitted > 0 ? need.fitted : ''}
        </Cell>
        <Cell figure head="In stock">
          {need.inStock > 0 ? need.inStock : ''}
        </Cell>
        <Cell>
          <span className="flex flex-wrap items-center gap-x-3 gap-y-0.5 whitespace-nowrap">
            <SteelRule
              small
              to={need.pieces}
              tick={tick}
              number={tick * 5}
              value={ready}
              width={104}
              says={`${ready} of ${need.pieces} ready`}
            />
            <span className="num">
              {ready} of {need.pieces}
            </span>
          </span>
        </Cell>
        <Cell className="py-1.5">
          <Rest need={need} />
        </Cell>
        <Cell right>
          {(canFit || need.fittedLots.length > 0) && (
            <Button look="word" aria-expanded={open} aria-controls={openId} onClick={() => setOpen(!open)}>
              {open && 'Close'}
              {!open && (canFit ? 'Fit' : 'Lots')}
              <span className="sr-only"> {need.partNumber}</span>
            </Button>
          )}
        </Cell>
      </Row>
      {open && (
        <tr role="row" id={openId}>
          <td role="cell" colSpan={span}>
            <div className="grid grid-cols-1 gap-x-gutter gap-y-5 py-2 lg:grid-cols-2">
              {mayFit && isOpen && (
                <div>
                  <h3 className="pb-1.5">In stock</h3>
                  {need.stock.length === 0 && <p className="text-quiet">Nothing of it is in stock.</p>}
                  {need.stock.map((spot) => (
                    <FitHere key={`${spot.lotId} ${spot.locationId}`} spot={spot} assemblyId={assembly.id} />
                  ))}
                </div>
              )}
              {need.fittedLots.length > 0 && (
                <div>
                  <h3 className="pb-1.5">Fitted</h3>
                  {need.fittedLots.map((lot) => (
                    <TakeOut key={lot.lotId} lot={lot} assembly={assembly} may={mayFit} />
                  ))}
                </div>
              )}
            </div>
          </td>
        </tr>
      )}
    </>
  );
}

function Rest({ need }: { need: AssemblyNeedRow }) {
  const clock = useClock();
  if (readyOf(need) >= need.pieces)
    return <span className="text-quiet">{need.fitted >= need.pieces ? 'all fitted' : 'all here'}</span>;
  const toMake = stillToMake(need);
  const inYard = yardWords(need);
  return (
    <>
      {need.batches.map((wait) => (
        <RestOnBatch key={wait.id} wait={wait} clock={clock} />
      ))}
      {inYard.length > 0 && (
        <span className="block">
          <Words words={inYard} />
        </span>
      )}
      {toMake > 0 && <span className="block font-cond text-dispatched-ink">{toMake} more to make</span>}
    </>
  );
}
