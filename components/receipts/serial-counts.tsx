'use client';
import { useFormContext } from 'react-hook-form';

import { Button } from '@/components/ui/button';
import type { ReceivingLine } from '@/lib/receipts/contract';

import type { CountFormIn, CountFormOut } from './count-form';

const STATES = [
  { value: 'good', says: 'good' },
  { value: 'damaged', says: 'damaged' },
  { value: '', says: 'not here' },
] as const;

/** Named pieces are told one by one: which of them is here, and how. */
export function SerialCounts({ line, at }: { line: ReceivingLine; at: number }) {
  const form = useFormContext<CountFormIn, unknown, CountFormOut>();
  const allGood = () => {
    for (const piece of line.awayPieces)
      form.setValue(`lines.${at}.named.${piece.id}`, 'good', { shouldDirty: true });
  };
  if (line.awayPieces.length === 0) return null;
  return (
    <div>
      <Button size="small" onClick={allGood}>
        All {line.awayPieces.length} are here and good
      </Button>
      <ul aria-label={`Serial numbers of line ${line.lineNo}`} className="pt-2">
        {line.awayPieces.map((piece) => (
          <li key={piece.id} className="border-b border-rule">
            <fieldset className="flex flex-wrap items-center gap-x-6 max-md:gap-x-3.5">
              <legend className="sr-only">Piece {piece.serial}</legend>
              <span aria-hidden="true" className="num min-w-28 font-semibold max-md:min-w-16">
                {piece.serial}
              </span>
              {STATES.map(({ value, says }) => (
                <label key={says} className="flex min-h-9 items-center gap-2 touch:min-h-12">
                  <input
                    type="radio"
                    value={value}
                    className="lw-check"
                    {...form.register(`lines.${at}.named.${piece.id}`)}
                  />
                  {says}
                </label>
              ))}
            </fieldset>
          </li>
        ))}
      </ul>
    </div>
  );
}
