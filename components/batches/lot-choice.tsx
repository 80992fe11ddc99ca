'use client';
import Link from 'next/link';

import { useMe } from '@/components/session/use-me';
import { fieldAttributes, FieldError } from '@/components/ui/field';
import { Cell, Row, Table } from '@/components/ui/table';
import type { WaitingLot } from '@/lib/batches/waiting-contract';

import { FigureKnown } from './figure-known';
import { massKnown, massText, massUnit } from './measures';

interface LotChoiceProps {
  rows: readonly WaitingLot[];
  /** What was typed for a lot; nothing typed: all its pieces. */
  typed: Readonly<Record<string, string>>;
  wrong: Readonly<Record<string, string>>;
  onType: (lotId: string, text: string) => void;
}

/** Lots with a tick and how many pieces of each go along. */
export function LotChoice({ rows, typed, wrong, onType }: LotChoiceProps) {
  const units = useMe()?.units ?? 'inch';
  const columns = [
    { says: 'Goes along', hidden: true },
    { says: 'Lot' },
    { says: 'Part' },
    { says: 'Material' },
    { says: 'Condition' },
    { says: `Mass, ${massUnit(units)}`, right: true },
    { says: 'Waits', right: true },
    { says: 'Pieces', right: true },
  ];
  return (
    <Table label="Lots that wait" columns={columns}>
      {rows.map((row) => {
        const text = typed[row.lotId] ?? String(row.pieces);
        const goes = text.trim() !== '' && text.trim() !== '0';
        return (
          <Row key={row.lotId} state={goes ? 'rest' : 'off'}>
            <Cell>
              <input
                type="checkbox"
                className="lw-check"
                aria-label={`${row.lotNumber} goes along`}
                checked={goes}
                onChange={(event) => onType(row.lotId, event.currentTarget.checked ? String(row.pieces) : '')}
              />
            </Cell>
            <Cell>
              <Link href={`/lots/${row.lotId}`} className="num font-semibold">
                {row.lotNumber}
              </Link>
            </Cell>
            <Cell>
              <span className="num font-semibold">{row.partNumber}</span>{' '}
              <span className="text-quiet">rev</span> <span className="num">{row.partRevision}</span>{' '}
              {row.partName}
              {row.partSuperseded && (
                <span className="block text-source text-dispatched-ink">superseded drawing</span>
              )}
            </Cell>
            <Cell head="Material">
              <span className="font-cond">{row.material}</span> <span className="num">{row.thickness}</span>
            </Cell>
            <Cell code head="Condition">
              {[row.conditionBefore, row.targetCondition].filter(Boolean).join(' to ')}
            </Cell>
            <Cell figure head={`Mass, ${massUnit(units)}`}>
              <FigureKnown known={massKnown(row)} text={(grams) => massText(grams, units)} />
            </Cell>
            <Cell figure head="Waits">
              {row.pieces.toLocaleString('en-US')}
            </Cell>
            <Cell right head="Pieces">
              <span className="inline-block w-32 text-left">
                <input
                  className="lw-input lw-input-number"
                  inputMode="numeric"
                  autoComplete="off"
                  aria-label={`Pieces of ${row.lotNumber}`}
                  value={text}
                  {...fieldAttributes(row.lotId, { error: wrong[row.lotId] })}
                  onChange={(event) => onType(row.lotId, event.currentTarget.value)}
                />
                {wrong[row.lotId] && <FieldError id={`${row.lotId}-error`} says={wrong[row.lotId] ?? ''} />}
              </span>
            </Cell>
          </Row>
        );
      })}
    </Table>
  );
}
