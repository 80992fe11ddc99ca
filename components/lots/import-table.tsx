'use client';

import { useState } from 'react';
import { Checkbox } from '@/components/ui/choice';
import { VerdictMark } from '@/components/ui/marks';
import { Cell, Row, Table } from '@/components/ui/table';
import type { OutputOf } from '@/lib/api/endpoint';
import type { checkLotImport } from '@/lib/lots/contract';
import { piecesIn, serialsIn, type RawRow } from '@/lib/lots/import-row';

interface ImportTableProps {
  rows: readonly RawRow[];
  checked: OutputOf<typeof checkLotImport>;
}

type CheckedRow = ImportTableProps['checked']['rows'][number];

const COLUMNS = [
  { says: 'Row', right: true },
  { says: 'Part' },
  { says: 'Heat' },
  { says: 'Pieces', right: true },
  { says: 'Lot' },
  { says: 'Made on' },
  { says: 'What is wrong' },
];
const SHOWN_AT_ONCE = 200;

/** Every row as it was read, with what is wrong beside the cell that is. */
export function ImportTable({ rows, checked }: ImportTableProps) {
  const wrong = checked.rows.filter(({ problems }) => problems.length > 0).length;
  const [onlyWrong, setOnlyWrong] = useState(false);
  const [shown, setShown] = useState(SHOWN_AT_ONCE);
  const numbered = rows.map((row, at) => ({
    row,
    number: at + 1,
    checked: checked.rows[at] ?? { problems: [], part: null },
  }));
  const listed = onlyWrong ? numbered.filter(({ checked: { problems } }) => problems.length > 0) : numbered;
  return (
    <>
      <div className="flex flex-wrap items-center gap-x-6" role="status">
        <strong className={wrong > 0 ? 'text-held-ink' : 'text-proved-ink'}>
          {wrong === 0
            ? 'Nothing is wrong.'
            : `${wrong} of ${rows.length} rows ${wrong === 1 ? 'is' : 'are'} wrong.`}
        </strong>
        {wrong > 0 && wrong < rows.length && (
          <Checkbox
            says="Show only those"
            checked={onlyWrong}
            onChange={(event) => setOnlyWrong(event.currentTarget.checked)}
          />
        )}
      </div>
      <Table label="Rows of the file" columns={COLUMNS} dense>
        {listed.slice(0, shown).map((line) => (
          <ImportLine key={line.number} {...line} />
        ))}
      </Table>
      {listed.length > shown && (
        <button type="button" className="lw-word-button pt-2" onClick={() => setShown(shown + SHOWN_AT_ONCE)}>
          Show {Math.min(SHOWN_AT_ONCE, listed.length - shown)} more
        </button>
      )}
    </>
  );
}

function ImportLine({
  row,
  number,
  checked: { problems, part },
}: {
  row: RawRow;
  number: number;
  checked: CheckedRow;
}) {
  const isWrong = (field: string) => problems.some((problem) => problem.field === field);
  const mark = (field: string) => (isWrong(field) ? 'text-held-ink font-semibold' : '');
  const pieces = piecesIn(row);
  return (
    <Row state={problems.length > 0 ? 'asks' : 'rest'}>
      <Cell figure head="Row">
        {number}
      </Cell>
      <Cell className={`[overflow-wrap:anywhere] ${mark('part')} ${mark('revision')}`}>
        <span className="num">{row.part}</span>{' '}
        {(part?.revision ?? row.revision) && <span>rev {part?.revision ?? row.revision}</span>}{' '}
        <span className="font-normal text-quiet">{part?.name}</span>
      </Cell>
      <Cell code head="Heat" className={mark('heat')}>
        {row.heat}
      </Cell>
      <Cell figure head="Pieces" className={`${mark('pieces')} ${mark('serials')}`}>
        {Number.isInteger(pieces) && pieces > 0 ? pieces.toLocaleString('en-US') : row.pieces}
        {serialsIn(row.serials).length > 0 && <span className="block font-normal text-quiet">by name</span>}
      </Cell>
      <Cell code head="Lot" className={mark('lot')}>
        {row.lot || <span className="text-quiet">next</span>}
      </Cell>
      <Cell code head="Made on" className={mark('madeOn')}>
        {row.madeOn || <span className="text-quiet">today</span>}
      </Cell>
      <Cell>
        {problems.map(({ field, message }) => (
          <span key={field + message} className="flex items-start gap-1.5 text-held-ink">
            <VerdictMark verdict="does_not_meet" size={12} className="mt-[3px] flex-none" />
            {message}
          </span>
        ))}
      </Cell>
    </Row>
  );
}
