import { z } from 'zod';

import { piecesField } from '@/components/ui/form-fields';
import type { InputOf } from '@/lib/api/endpoint';
import type { countIn, ReceivingLine } from '@/lib/receipts/contract';

/** As typed; what is empty is none. */
const Counted = (name: string) => z.preprocess((typed) => (typed === '' ? '0' : typed), piecesField(name));

export const CountForm = z.object({
  note: z.string(),
  lines: z.array(
    z.object({
      lineId: z.string(),
      good: Counted('Good'),
      damaged: Counted('Damaged'),
      short: Counted('Short'),
      over: Counted('Over'),
      note: z.string(),
      /** Each named piece: `good`, `damaged`, or empty while it is not here. */
      named: z.record(z.string(), z.string()),
    }),
  ),
});
export type CountFormIn = z.input<typeof CountForm>;
export type CountFormOut = z.output<typeof CountForm>;

export const emptyCount = (lines: readonly ReceivingLine[]): CountFormIn => ({
  note: '',
  lines: lines.map((line) => ({
    lineId: line.id,
    good: '0',
    damaged: '0',
    short: '0',
    over: '0',
    note: '',
    named: Object.fromEntries(line.awayPieces.map((piece) => [piece.id, ''])),
  })),
});

interface Adding {
  batchId: string;
  lines: readonly ReceivingLine[];
  photos: readonly string[];
}

/** The form as the count it stands for. Named pieces are counted by their ticks. */
export function countOf(form: CountFormOut, { batchId, lines, photos }: Adding): InputOf<typeof countIn> {
  return {
    batchId,
    note: form.note,
    photos: photos.map((fileId) => ({ fileId, lineId: null })),
    lines: form.lines.map(({ named, ...count }) => {
      if (!lines.find((line) => line.id === count.lineId)?.serialised) return count;
      const ids = (as: string) => Object.keys(named).filter((id) => named[id] === as);
      const [goodPieceIds, damagedPieceIds] = [ids('good'), ids('damaged')];
      return {
        ...count,
        good: goodPieceIds.length,
        damaged: damagedPieceIds.length,
        goodPieceIds,
        damagedPieceIds,
      };
    }),
  };
}

interface Sums {
  good: number;
  damaged: number;
  short: number;
  over: number;
}

/** What is counted so far, for the button; what is not yet a number counts as none. */
export function sumsOf(lines: CountFormIn['lines']): Sums {
  const read = (typed: unknown) =>
    typeof typed === 'string' && /^\d+$/.test(typed.trim()) ? Number(typed) : 0;
  const named = (line: CountFormIn['lines'][number], as: string) =>
    Object.values(line.named).filter((one) => one === as).length;
  const sum = (of: (line: CountFormIn['lines'][number]) => number) =>
    lines.reduce((all, line) => all + of(line), 0);
  return {
    good: sum((line) => read(line.good) + named(line, 'good')),
    damaged: sum((line) => read(line.damaged) + named(line, 'damaged')),
    short: sum((line) => read(line.short)),
    over: sum((line) => read(line.over)),
  };
}
