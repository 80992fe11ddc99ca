import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { SCALARS } from '@/tests/evidence/score/compare-with-truth';

export interface House {
  readonly name: string;
  readonly page: string;
  /** As `told` writes it, without what is not to be tested. */
  readonly told: string;
}

type Some<T> = { readonly [Key in keyof T]?: T[Key] | undefined };

const cells = (...values: readonly unknown[]): string =>
  values.map((value) => String(value ?? '-')).join(' | ');

/** What a certificate states, a line for each fact, part, cycle and series of readings. */
export function told(stated: Some<Omit<StatedCertificate, 'facts'>>): string[] {
  return [
    ...SCALARS.flatMap((field) =>
      stated[field] === undefined ? [] : [`${field}: ${String(stated[field])}`],
    ),
    ...(stated.lines ?? []).map((line) =>
      cells(
        'part',
        line.part_number,
        line.rev,
        line.qty_accepted,
        line.qty_rejected,
        line.material,
        line.lot,
      ),
    ),
    ...(stated.cycles ?? []).map(({ step, set_temp, unit, soak_start, soak_end, minutes }) =>
      cells('cycle', step, set_temp, unit, soak_start, soak_end, minutes),
    ),
    ...(stated.readings ?? []).map(({ kind, unit, values }) =>
      cells('readings', kind, unit, values.join(', ')),
    ),
  ];
}
