import type { Alloy } from '@/lib/trade/alloys/alloy';
import type { LoadGroup } from '@/lib/trade/heat-treat/load-needs';
import type { ProductForm } from '@/lib/trade/process';
import type { FurnaceMedium } from '@/lib/trade/tables/soak-times';
import type { QuenchMedium } from '@/lib/trade/tables/quench-media';
import type { Temper } from '@/lib/trade/tempers/temper';

export const LINES = ['a', 'b', 'c', 'd', 'e', 'f'] as const;
export type LineName = (typeof LINES)[number];

/** What a user makes by solution treating: aged at room temperature, or in an oven. */
export const WANTED = ['AQ', 'T42', 'T4', 'T62', 'T6', 'T73'] as const satisfies readonly Temper[];
const NOT_OVEN_AGED: readonly Temper[] = ['AQ', 'T42', 'T4'];

export interface TypedLine {
  readonly name: LineName;
  readonly alloy: Alloy;
  /** Null where it could not be read. */
  readonly thicknessMm: number | null;
  readonly clad: boolean;
  readonly to: (typeof WANTED)[number];
}

interface FurnaceWork {
  readonly form: ProductForm;
  readonly medium: FurnaceMedium;
  readonly quench: QuenchMedium;
}

/** Lines as groups to be planned; those without a thickness are left out. One thickness throughout is assumed. */
export const groupsOf = (lines: readonly TypedLine[], work: FurnaceWork): LoadGroup[] =>
  lines.flatMap(({ name, alloy, thicknessMm, clad, to }) =>
    thicknessMm === null
      ? []
      : [
          {
            ...work,
            key: name.toUpperCase(),
            alloy,
            clad,
            thicknessMm,
            thinnestMm: thicknessMm,
            from: 'O' as const,
            to,
            process: NOT_OVEN_AGED.includes(to)
              ? ('solution_heat_treat' as const)
              : ('solution_heat_treat_and_age' as const),
          },
        ],
  );
