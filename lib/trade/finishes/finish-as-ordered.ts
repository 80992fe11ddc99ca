import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { FinishDefaultRow } from '../tables/finish-defaults';
import type { FinishRow } from '../tables/finish-row';
import { mmFromInches } from '../units/length';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';
import { calledRevision, type CalledDocument } from './called-revision';
import { readDesignation, type Designation, type DesignationKey } from './read-designation';

/** Coating thickness in mm, on one face. */
export interface CoatingThickness {
  readonly minMm?: number;
  readonly maxMm?: number;
  readonly nominalMm?: number;
}

/** One thing that the order asks for, with where it stands. */
export interface FinishFact extends Pick<
  FinishRow,
  'says' | 'saltSprayHours' | 'saltSprayTo' | 'qualificationHours' | 'weight'
> {
  readonly for: Designation;
  readonly thickness?: CoatingThickness;
  readonly temperatureCMax?: number;
  readonly hardeningC?: readonly [number, number];
  readonly source: Source;
}

export interface FinishAsOrdered {
  readonly finish: FinishRow['finish'];
  /** As stated, with what the document means where the order is silent. */
  readonly designation: Designation;
  readonly assumed: readonly {
    readonly key: DesignationKey;
    readonly value: string;
    readonly source: Source;
  }[];
  /** What the document divides by and the order does not say. */
  readonly notStated: readonly DesignationKey[];
  readonly facts: readonly FinishFact[];
  readonly thickness?: CoatingThickness;
}

/**
 * What a finish on an order stands for: thickness, salt spray, highest temperature, coating weight.
 *
 * Worked examples: QQ-P-416 `type II class 2` is at least 0.0003 in, 0.00762 mm, with chromate and 96 h to white
 * corrosion. MIL-DTL-5541 `class 1A` means Type I, with hexavalent chromium, because it says no type.
 */
export function finishAsOrdered(
  tables: { readonly classes: readonly Table<FinishRow>[]; readonly defaults: Table<FinishDefaultRow> },
  ordered: CalledDocument & { readonly classType: string },
): Verdict<FinishAsOrdered, 'specification_not_in_table' | 'designation_not_in_table'> {
  const isCalled = ({ specifications }: { readonly specifications: readonly string[] }): boolean =>
    specifications.some((one) => calledRevision(one, ordered) !== null);
  const table = tables.classes.find(({ rows }) => rows.some(isCalled));
  const rows = table?.rows.filter(isCalled) ?? [];
  const [first] = rows;
  if (!table || !first) return { ok: false, reason: 'specification_not_in_table' };

  const stated = readDesignation(ordered.classType);
  const assumed = tables.defaults.rows
    .filter(isCalled)
    .flatMap((row) => (row.rule === 'when_unstated' ? assumptionsOf(row.means, stated, row.source) : []));
  const designation: Designation = {
    ...stated,
    ...Object.fromEntries(assumed.map(({ key, value }) => [key, value])),
  };
  const divides = dividingKeys(rows);
  if (
    divides.some(
      (key) => designation[key] !== undefined && !rows.some((row) => row.for[key] === designation[key]),
    )
  )
    return { ok: false, reason: 'designation_not_in_table', source: first.source };

  const facts = rows.filter((row) => holds(row, designation)).map(factOf);
  const thick = facts.find((fact) => fact.thickness);
  const open = dividingKeys(rows.filter((row) => !contradicts(row, designation)));
  return {
    ok: true,
    finish: first.finish,
    designation,
    assumed,
    notStated: open.filter((key) => designation[key] === undefined && !isSaidOtherwise(key, designation)),
    facts,
    ...(thick?.thickness && { thickness: thick.thickness }),
    source: thick?.source ?? facts[0]?.source ?? first.source,
    readFrom: referenceTo(table),
  };
}

const KEYS: readonly DesignationKey[] = [
  'type',
  'class',
  'grade',
  'method',
  'level',
  'serviceCondition',
  'feZn',
];

const dividingKeys = (rows: readonly FinishRow[]): DesignationKey[] =>
  KEYS.filter((key) => rows.some((row) => row.for[key] !== undefined));

/** Zinc is called by its service condition or by Fe/Zn and microns: two names of one thing. */
const isSaidOtherwise = (key: DesignationKey, { serviceCondition, feZn }: Designation): boolean =>
  (key === 'serviceCondition' && feZn !== undefined) || (key === 'feZn' && serviceCondition !== undefined);

const contradicts = (row: FinishRow, called: Designation): boolean =>
  KEYS.some((key) => row.for[key] !== undefined && called[key] !== undefined && row.for[key] !== called[key]);

const holds = (row: FinishRow, called: Designation): boolean =>
  !contradicts(row, called) &&
  KEYS.every(
    (key) => row.for[key] === undefined || called[key] !== undefined || isSaidOtherwise(key, called),
  );

function assumptionsOf(means: Designation, stated: Designation, source: Source): FinishAsOrdered['assumed'] {
  return KEYS.flatMap((key) => {
    const value = means[key];
    return value === undefined || stated[key] !== undefined ? [] : [{ key, value, source }];
  });
}

function factOf(row: Table<FinishRow>['rows'][number]): FinishFact {
  const { says, saltSprayHours, saltSprayTo, qualificationHours, weight, source } = row;
  return {
    for: row.for,
    ...(says !== undefined && { says }),
    ...(saltSprayHours !== undefined && { saltSprayHours }),
    ...(saltSprayTo !== undefined && { saltSprayTo }),
    ...(qualificationHours !== undefined && { qualificationHours }),
    ...(weight && { weight }),
    ...(row.thickness && { thickness: thicknessOf(row.thickness) }),
    ...(row.mostF !== undefined && { temperatureCMax: celsiusFromFahrenheit(row.mostF) }),
    ...(row.hardeningF && {
      hardeningC: [
        celsiusFromFahrenheit(row.hardeningF[0]),
        celsiusFromFahrenheit(row.hardeningF[1]),
      ] as const,
    }),
    source,
  };
}

const MICRONS_PER_MM = 1000;

function thicknessOf({ unit, min, max, nominal }: NonNullable<FinishRow['thickness']>): CoatingThickness {
  const mm = (printed: number): number => (unit === 'in' ? mmFromInches(printed) : printed / MICRONS_PER_MM);
  return {
    ...(min !== undefined && { minMm: mm(min) }),
    ...(max !== undefined && { maxMm: mm(max) }),
    ...(nominal !== undefined && { nominalMm: mm(nominal) }),
  };
}
