'use client';
import Link from 'next/link';
import { Fragment, useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useMay, useMe } from '@/components/session/use-me';
import { Amount } from '@/components/ui/amount';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { LoadNumber } from '@/components/ui/frame-number';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { getBatch, getBatchLines, type BatchLine } from '@/lib/batches/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';

import { FigureKnown } from './figure-known';
import { LineEditor } from './line-editor';
import {
  areaKnown,
  areaText,
  areaUnit,
  massKnown,
  massText,
  massUnit,
  sumOfKnown,
  type Units,
} from './measures';

/** What is in the batch, line by line; a line opens in place to be changed while the batch is here. */
export function LinesSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  const units = useMe()?.units ?? 'inch';
  const mayBuild = useMay('batch.build') && batch.dispatchedAt === null && batch.cancelledAt === null;
  const [openId, setOpen] = useState<string | null>(null);
  const lots = data.lines.length;
  return (
    <Section
      id="lines"
      title="Lines"
      note={`${lots} ${lots === 1 ? 'lot' : 'lots'}, one step: ${PROCESS_WORDS[batch.process]}${batch.dispatchedAt ? ', frozen at dispatch' : ''}`}
      action={
        mayBuild && (
          <Button
            look="word"
            shortcut="A"
            onClick={() => document.getElementById('ride-along')?.scrollIntoView({ block: 'center' })}
          >
            Add a lot
          </Button>
        )
      }
    >
      {lots === 0 && <Empty says="Nothing is in it." comes="Add a lot that waits for a step, below." />}
      {lots > 0 && (
        <Table label="Lines" columns={columnsOf(units, mayBuild)}>
          {data.lines.map((line) => (
            <Fragment key={line.id}>
              <LineRow
                line={line}
                units={units}
                open={openId === line.id}
                toggle={mayBuild ? () => setOpen(openId === line.id ? null : line.id) : undefined}
              />
              {openId === line.id && (
                <tr role="row">
                  <td role="cell" colSpan={columnsOf(units, mayBuild).length} className="bg-bench">
                    <LineEditor key={batch.version} batch={batch} line={line} onDone={() => setOpen(null)} />
                  </td>
                </tr>
              )}
            </Fragment>
          ))}
          <SumRow lines={data.lines} units={units} open={mayBuild} />
        </Table>
      )}
    </Section>
  );
}

const columnsOf = (units: Units, mayChange: boolean) => [
  { says: 'Line', hidden: true },
  { says: 'Lot' },
  { says: 'Part' },
  { says: 'Material' },
  { says: 'Condition' },
  { says: 'Pieces', right: true },
  { says: `Mass, ${massUnit(units)}`, right: true },
  { says: `Area, ${areaUnit(units)}`, right: true },
  { says: 'Each', right: true },
  { says: 'Load', right: true },
  ...(mayChange ? [{ says: 'Change', hidden: true }] : []),
];

function LineRow({
  line,
  units,
  open,
  toggle,
}: {
  line: BatchLine;
  units: Units;
  open: boolean;
  toggle: (() => void) | undefined;
}) {
  return (
    <Row selected={open}>
      <Cell code quiet>
        {line.lineNo}
      </Cell>
      <Cell>
        <Link href={`/lots/${line.lotId}`} className="num font-semibold">
          {line.lotNumber}
        </Link>
      </Cell>
      <Cell className="min-w-44 [overflow-wrap:anywhere]">
        <Link href={`/parts/${line.partId}`} className="num font-semibold no-underline hover:underline">
          {line.partNumber}
        </Link>{' '}
        <span className="text-quiet">rev</span> <span className="num">{line.partRevision}</span>{' '}
        {line.partName}
        {line.serials.length > 0 && (
          <span className="block text-source text-quiet">serials {line.serials.join(', ')}</span>
        )}
      </Cell>
      <Cell head="Material">
        <span className="font-cond">{line.material}</span>{' '}
        <span className="num whitespace-nowrap">{line.thickness}</span>
      </Cell>
      <Cell code head="Condition" className="whitespace-nowrap">
        {line.conditionBefore}{' '}
        {line.conditionBefore && line.targetCondition && <span className="font-cond text-faint">to</span>}{' '}
        {line.targetCondition}
      </Cell>
      <Cell figure strong head="Pieces">
        {line.pieces.toLocaleString('en-US')}
      </Cell>
      <Cell figure head={`Mass, ${massUnit(units)}`}>
        <FigureKnown known={massKnown(line)} text={(grams) => massText(grams, units)} />
      </Cell>
      <Cell figure head={`Area, ${areaUnit(units)}`}>
        <FigureKnown known={areaKnown(line)} text={(mm2) => areaText(mm2, units)} />
      </Cell>
      <Cell figure head="Each">
        {line.unitPriceMinor > 0 && <Amount minor={line.unitPriceMinor} />}
      </Cell>
      <Cell right head="Load">
        {line.loadNo !== null && <LoadNumber number={line.loadNo} />}
      </Cell>
      {toggle && (
        <Cell right>
          <Button look="word" aria-expanded={open} aria-label={`Change line ${line.lineNo}`} onClick={toggle}>
            {open ? 'Close' : 'Change'}
          </Button>
        </Cell>
      )}
    </Row>
  );
}

function SumRow({ lines, units, open }: { lines: readonly BatchLine[]; units: Units; open: boolean }) {
  const loads = new Set(lines.flatMap((line) => line.loadNo ?? [])).size;
  return (
    <Row state="sum">
      <Cell />
      <Cell colSpan={4}>All lines</Cell>
      <Cell figure head="Pieces">
        {lines.reduce((sum, line) => sum + line.pieces, 0).toLocaleString('en-US')}
      </Cell>
      <Cell figure head={`Mass, ${massUnit(units)}`}>
        <FigureKnown known={sumOfKnown(lines.map(massKnown))} text={(grams) => massText(grams, units)} />
      </Cell>
      <Cell figure head={`Area, ${areaUnit(units)}`}>
        <FigureKnown known={sumOfKnown(lines.map(areaKnown))} text={(mm2) => areaText(mm2, units)} />
      </Cell>
      <Cell />
      <Cell right>{loads > 0 && `${loads} ${loads === 1 ? 'load' : 'loads'}`}</Cell>
      {open && <Cell />}
    </Row>
  );
}
