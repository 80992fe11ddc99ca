import type { Alloy, AlloyFamily } from '@/lib/trade/alloys/alloy';
import { presentName, type PresentName } from '@/lib/trade/alloys/present-name';
import { readMaterial } from '@/lib/trade/alloys/read-material';
import type { ProductForm } from '@/lib/trade/process';
import type { Table } from '@/lib/trade/table';
import type { OldNameRow } from '@/lib/trade/tables/old-names';
import type { TemperRow } from '@/lib/trade/tables/tempers';
import { readTemper } from '@/lib/trade/tempers/read-temper';
import type { Temper } from '@/lib/trade/tempers/temper';
import type { Grounds } from '@/lib/trade/verdict';

/** Of a part what its person typed of the material. */
export interface TypedMaterial {
  readonly alloy: string;
  /** Empty while none is chosen. */
  readonly form: ProductForm | '';
  readonly clad: boolean;
}

export interface MaterialTables {
  readonly tempers: Table<TemperRow>;
  readonly oldNames: Table<OldNameRow>;
}

/** What the trade library can reckon with. */
export interface PartMaterial {
  readonly alloy: Alloy;
  readonly family: AlloyFamily;
  readonly form: ProductForm | undefined;
  /** Ticked, or said by the alloy's name. */
  readonly clad: boolean;
  /** Said behind the alloy's number: the T3 of `2024-T3`. */
  readonly saidTemper: Temper | undefined;
}

export type MaterialOf =
  | { readonly known: 'yes'; readonly material: PartMaterial }
  /** A former name such as 24S: proposed, never taken over by itself. */
  | { readonly known: 'former_name'; readonly formerly: PresentName & Grounds }
  | { readonly known: 'no' };

/**
 * The material of a part from its typed words. What cannot be read is `no`, and nothing is concluded from it.
 *
 * @example materialOf(tables, {alloy: 'Alclad 2024', form: 'sheet', clad: false}) is 2024, clad
 * @example materialOf(tables, {alloy: '24S', ...}) is a former name, today 2024
 */
export function materialOf({ tempers, oldNames }: MaterialTables, typed: TypedMaterial): MaterialOf {
  const read = readMaterial(tempers, typed.alloy);
  if (read.ok)
    return {
      known: 'yes',
      material: {
        alloy: read.alloy,
        family: read.family,
        form: typed.form || undefined,
        clad: typed.clad || read.saysClad,
        saidTemper: read.temper?.temper,
      },
    };
  const formerly = presentName(oldNames, typed.alloy.trim());
  return formerly.ok ? { known: 'former_name', formerly } : { known: 'no' };
}

/**
 * A condition as typed, where the table of designations has it: `T 42`, `-T6`, `0`. Steel and stainless conditions
 * (`annealed`, `H1025`, `160 to 180 ksi`) are no tempers.
 */
export function temperOf(tempers: Table<TemperRow>, typed: string): Temper | undefined {
  const read = readTemper(tempers, typed);
  return read.ok ? read.stated.temper : undefined;
}
