import type { Replaceable } from './replaceable';
import { ALUMINIUM_ROWS } from './rows/aluminium';
import { CONDITION_ROWS } from './rows/conditions';
import { FINISH_ROWS } from './rows/finishes';
import { INSPECTION_ROWS } from './rows/inspection';
import { SPECIFICATION_ROWS } from './rows/specifications';
import { STEEL_ROWS } from './rows/steel';

/** Tables by subject, in the order in which they are listed. */
export const TABLES_BY_SUBJECT: readonly { subject: string; tables: readonly Replaceable[] }[] = [
  { subject: 'Heat treatment of aluminium', tables: ALUMINIUM_ROWS },
  { subject: 'Materials and conditions', tables: CONDITION_ROWS },
  { subject: 'Steel', tables: STEEL_ROWS },
  { subject: 'Finishes', tables: FINISH_ROWS },
  { subject: 'Inspection and sampling', tables: INSPECTION_ROWS },
  { subject: 'Specifications and the order', tables: SPECIFICATION_ROWS },
];

/** Every table that a shop may enter its own edition of, by id: all that the product's answers are read from. */
export const REPLACEABLE: ReadonlyMap<string, Replaceable> = new Map(
  TABLES_BY_SUBJECT.flatMap(({ tables }) => tables).map((one) => [one.published.id, one]),
);
