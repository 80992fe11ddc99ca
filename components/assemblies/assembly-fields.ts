import { z } from 'zod';

import { piecesField } from '@/components/ui/form-fields';
import type { OutputOf } from '@/lib/api/endpoint';
import type { getAssembly } from '@/lib/assemblies/contract';

/** As typed. Rows in which nothing is typed are left out, so that an empty last row is no fault. */
export const AssemblyFields = z
  .object({
    name: z.string().trim().min(1, 'Give the assembly a name.').max(80, 'Write 80 characters or less.'),
    neededOn: z.string(),
    note: z.string().trim().max(1000, 'Write 1000 characters or less.'),
    needs: z.array(
      z.object({
        partNumber: z.string().trim().max(80, 'A part number has 80 characters or less.'),
        pieces: z.string(),
      }),
    ),
  })
  .transform((typed, issues) => {
    const needs = typed.needs.flatMap((need, at) => {
      if (need.partNumber === '' && need.pieces.trim() === '') return [];
      const fault = (field: 'partNumber' | 'pieces', message: string) =>
        issues.addIssue({ code: 'custom', path: ['needs', at, field], message });
      const read = piecesField().safeParse(need.pieces);
      if (need.partNumber === '') fault('partNumber', 'Enter the part number.');
      if (typed.needs.findIndex((other) => other.partNumber === need.partNumber) < at)
        fault('partNumber', 'This part is in the list already. Change its pieces there.');
      if (!read.success) fault('pieces', read.error.issues[0]?.message ?? 'Enter a number.');
      else if (read.data < 1) fault('pieces', 'Enter 1 or more, or take the part out.');
      return [{ partNumber: need.partNumber, pieces: read.success ? read.data : 0, at }];
    });
    return {
      name: typed.name,
      neededOn: typed.neededOn === '' ? null : typed.neededOn,
      note: typed.note === '' ? null : typed.note,
      needs,
    };
  });
export type AssemblyFieldsIn = z.input<typeof AssemblyFields>;
export type AssemblyFieldsOut = z.output<typeof AssemblyFields>;

const EMPTY_ROW = { partNumber: '', pieces: '' };
export const NEW_ASSEMBLY: AssemblyFieldsIn = { name: '', neededOn: '', note: '', needs: [EMPTY_ROW] };

export const fieldsOf = ({
  name,
  neededOn,
  note,
  needs,
}: OutputOf<typeof getAssembly>): AssemblyFieldsIn => ({
  name,
  neededOn: neededOn ?? '',
  note: note ?? '',
  needs: [...needs.map(({ partNumber, pieces }) => ({ partNumber, pieces: String(pieces) })), EMPTY_ROW],
});

/** What is sent; where each need stands in the form is kept for the way back. */
export const sentOf = ({ needs, ...rest }: AssemblyFieldsOut) => ({
  ...rest,
  needs: needs.map(({ partNumber, pieces }) => ({ partNumber, pieces })),
});

/** A refusal of the third need that was sent belongs to the row it was typed in. */
export function atFormRow(field: string, sent: AssemblyFieldsOut): string {
  const [, at, rest] = /^needs\.(\d+)\.(\w+)$/.exec(field) ?? [];
  const row = at === undefined ? undefined : sent.needs[Number(at)]?.at;
  return row === undefined ? field : `needs.${row}.${rest ?? 'partNumber'}`;
}
