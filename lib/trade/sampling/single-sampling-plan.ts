import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import { SAMPLE_LETTERS, type SampleLetter } from './code-letter';

/** Acceptable quality levels of the tables, in nonconforming pieces per hundred. */
export const AQLS = [0.1, 0.15, 0.25, 0.4, 0.65, 1, 1.5, 2.5, 4, 6.5] as const;
export type Aql = (typeof AQLS)[number];

/** What stands in a cell: a plan as [accept, reject], or an arrow to the next plan below or above. */
export type SamplingCell = readonly [accept: number, reject: number] | 'down' | 'up';

/** A stretch of a printed row; a letter may have several, since not all of a row was read in the same place. */
export interface SingleSamplingRow {
  readonly letter: SampleLetter;
  readonly sampleSize: number;
  readonly cells: Readonly<Partial<Record<Aql, SamplingCell>>>;
}

export interface SingleSamplingPlan {
  /** The letter whose plan is used; not the letter asked for where an arrow was followed. */
  readonly letter: SampleLetter;
  readonly sampleSize: number;
  /** The lot passes with so many nonconforming pieces in the sample. */
  readonly accept: number;
  /** It fails with so many. In reduced inspection numbers may lie between the two. */
  readonly reject: number;
  readonly arrow: 'down' | 'up' | null;
}

/**
 * The plan of a single-sampling table, arrows followed. An arrow changes the sample size as well as the numbers: the
 * whole plan it points to is used.
 *
 * The tables of normal and tightened inspection were read in part; reduced inspection (Table II-C) is from memory only.
 *
 * @param table the printed table for normal, tightened or reduced inspection.
 * @param aqlPct one of the table's levels, in percent (0.1 to 6.5); not interpolated.
 * @returns the plan; refused as `aql_not_in_table` or `letter_not_in_table`.
 * @example normal inspection, letter F, AQL 1.0: the arrow leads up to letter E, 13 pieces, accept 0, reject 1.
 */
export function singleSamplingPlan(
  table: Table<SingleSamplingRow>,
  letter: SampleLetter,
  aqlPct: number,
): Verdict<SingleSamplingPlan, 'aql_not_in_table' | 'letter_not_in_table'> {
  const aql = AQLS.find((level) => level === aqlPct);
  if (aql === undefined) return { ok: false, reason: 'aql_not_in_table' };
  const asked = cellAt(table, letter, aql);
  if (!asked) return { ok: false, reason: 'letter_not_in_table' };
  const arrow = typeof asked.cell === 'string' ? asked.cell : null;
  let at: CellAt | null = asked;
  let index = SAMPLE_LETTERS.indexOf(letter);
  while (at && typeof at.cell === 'string') {
    index += at.cell === 'down' ? 1 : -1;
    const next = SAMPLE_LETTERS[index];
    at = next === undefined ? null : cellAt(table, next, aql);
  }
  if (!at || typeof at.cell === 'string') return { ok: false, reason: 'letter_not_in_table' };
  const [accept, reject] = at.cell;
  return {
    ok: true,
    letter: at.letter,
    sampleSize: at.sampleSize,
    accept,
    reject,
    arrow,
    // An arrow that was recalled leads to a plan that may have been read: the answer is as sure as the arrow.
    source: asked.source.confidence === 'read' ? at.source : asked.source,
    readFrom: referenceTo(table),
  };
}

interface CellAt {
  letter: SampleLetter;
  sampleSize: number;
  cell: SamplingCell;
  source: Source;
}

function cellAt(table: Table<SingleSamplingRow>, letter: SampleLetter, aql: Aql): CellAt | null {
  for (const row of table.rows) {
    const cell = row.letter === letter ? row.cells[aql] : undefined;
    if (cell !== undefined) return { letter, sampleSize: row.sampleSize, cell, source: row.source };
  }
  return null;
}
