import { z } from 'zod';

import { piecesField } from '@/components/ui/form-fields';
import type { InputOf } from '@/lib/api/endpoint';
import type { FieldError } from '@/lib/errors';
import type { GateLine, releasePieces } from '@/lib/stock/contract';

type Input = InputOf<typeof releasePieces>;

/** As typed; empty is none. Of a lot whose pieces have names, the ticked names are the count. */
export const ReleaseForm = z.object({
  lines: z.array(
    z
      .object({
        lineId: z.string(),
        lineNo: z.number(),
        mayPass: z.number(),
        goesOn: z.boolean(),
        isNamed: z.boolean(),
        pieces: z.preprocess((typed) => (typed === '' ? '0' : typed), piecesField()),
        names: z.array(z.string()),
        locationId: z.string(),
      })
      .superRefine((line, issues) => {
        const pieces = countOf(line);
        if (pieces > line.mayPass)
          issues.addIssue({
            code: 'custom',
            path: ['pieces'],
            message: `${line.mayPass} may pass now. Enter ${line.mayPass} or less.`,
          });
        if (pieces > 0 && !line.goesOn && line.locationId === '')
          issues.addIssue({ code: 'custom', path: ['locationId'], message: 'Choose the place they go to.' });
      }),
  ),
});
export type ReleaseFormIn = z.input<typeof ReleaseForm>;
export type ReleaseFormOut = z.output<typeof ReleaseForm>;

const countOf = (line: { isNamed: boolean; names: readonly string[]; pieces: number }) =>
  line.isNamed ? line.names.length : line.pieces;

/** All that may pass, to where such pieces went the last time. */
export const allThatMay = (lines: readonly GateLine[]): ReleaseFormIn => ({
  lines: lines.map((line) => ({
    lineId: line.lineId,
    lineNo: line.lineNo,
    mayPass: line.mayPass,
    goesOn: line.nextProcess !== null,
    isNamed: line.named.length > 0,
    pieces: String(line.mayPass),
    names: line.named.slice(0, line.mayPass).map((piece) => piece.id),
    locationId: line.usualLocationId ?? '',
  })),
});

/** What is sent; lines of which nothing is taken stay at home. */
export function releaseOf(batchId: string, { lines }: ReleaseFormOut): Input {
  return {
    batchId,
    lines: lines
      .filter((line) => countOf(line) > 0)
      .map((line) => ({
        lineId: line.lineId,
        pieces: countOf(line),
        locationId: line.goesOn ? null : line.locationId,
        ...(line.isNamed ? { pieceIds: line.names } : {}),
      })),
  };
}

/** The server counts the lines it was sent; the form counts all. */
export function atFormLine(error: FieldError, sent: Input, form: ReleaseFormIn): FieldError {
  const [, at, field] = /^lines\.(\d+)\.(\w+)$/.exec(error.field) ?? [];
  const lineId = at === undefined ? undefined : sent.lines[Number(at)]?.lineId;
  const line = form.lines.findIndex((one) => one.lineId === lineId);
  return line < 0 ? error : { field: `lines.${line}.${field ?? 'pieces'}`, message: error.message };
}

/** How much is chosen now, while it is being typed; what is not yet a number counts as none. */
export function chosenOf({ lines }: ReleaseFormIn): { toStock: number; goingOn: number } {
  const read = (line: ReleaseFormIn['lines'][number]) => {
    if (line.isNamed) return line.names.length;
    return typeof line.pieces === 'string' && /^\s*\d+\s*$/.test(line.pieces) ? Number(line.pieces) : 0;
  };
  const sum = (goesOn: boolean) =>
    lines.filter((line) => line.goesOn === goesOn).reduce((all, line) => all + read(line), 0);
  return { toStock: sum(false), goingOn: sum(true) };
}

/** `Release 40 to stock`, `Release 15 to their next step`, `Release 40: 25 to stock, 15 onward`. */
export function releaseWords({ toStock, goingOn }: ReturnType<typeof chosenOf>): string {
  if (goingOn === 0) return `Release ${toStock} to stock`;
  if (toStock === 0) return `Release ${goingOn} to ${goingOn === 1 ? 'its' : 'their'} next step`;
  return `Release ${toStock + goingOn}: ${toStock} to stock, ${goingOn} onward`;
}
