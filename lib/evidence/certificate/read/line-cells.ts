import { TRUST, type AnswerValue } from './answers';
import { annealed, codeIn, countIn, partIn, revisionIn, wordsIn, type Reading } from './codes';
import { beginsWithDay } from './identity';
import type { LabelKey } from './labels';
import type { Paper } from './paper';

export interface ReadCell<Value> extends Reading<Value> {
  readonly trust: number;
}

/** A line of the certificate as far as it was read. */
export interface ReadLine {
  part?: ReadCell<string>;
  rev?: ReadCell<string>;
  accepted?: ReadCell<number>;
  rejected?: ReadCell<number>;
  /** Pieces without a word on whether they were accepted. */
  quantity?: ReadCell<number>;
  received?: ReadCell<number>;
  material?: ReadCell<string>;
  lot?: ReadCell<string>;
  heat?: ReadCell<string>;
  serials?: ReadCell<readonly string[]>;
  /** Stands for the material where none is stated. */
  alloy?: ReadCell<string>;
}

type Writer = (line: ReadLine, value: AnswerValue, paper: Paper) => boolean;

function cell<Value>(reading: Reading<Value> | null, { how }: AnswerValue): ReadCell<Value> | null {
  return reading && { ...reading, trust: TRUST[how] };
}

/** How each label's value is read into a line; false where it is not of the label's shape. */
export const WRITERS: Partial<Record<LabelKey, Writer>> = {
  part_number: (line, value) => {
    const read = cell(partIn(value.passage, beginsWithDay), value);
    if (!read || line.part) return false;
    line.part = { ...read, value: read.value.part };
    if (read.value.rev !== null) line.rev ??= { ...read, value: read.value.rev };
    return true;
  },
  revision: (line, value) => {
    const read = cell(revisionIn(value.passage), value);
    if (read) line.rev ??= read;
    return read !== null;
  },
  quantity: counted('quantity'),
  quantity_accepted: counted('accepted'),
  quantity_rejected: counted('rejected'),
  quantity_received: counted('received'),
  material: (line, value) => {
    const read = cell(wordsIn(value.passage), value);
    if (read && NO_MATERIAL.test(read.value)) return false;
    if (read && read.value.length <= 80) line.material ??= { ...read, value: annealed(read.value) };
    return read !== null;
  },
  alloy: (line, value) => {
    const read = cell(wordsIn(value.passage), value);
    if (read && /\d/.test(read.value) && read.value.length <= 80)
      line.alloy ??= { ...read, value: annealed(read.value) };
    return read !== null;
  },
  // Under "Material" stands no name of a part.
  description: (line, value) => {
    const read = cell(wordsIn(value.passage), value);
    if (!read || !IS_MATERIAL.test(read.value) || read.value.length > 80) return false;
    line.alloy ??= { ...read, value: annealed(read.value) };
    return true;
  },
  lot: coded('lot'),
  heat: coded('heat'),
  serial: (line, value) => {
    const read = cell(wordsIn(value.passage), value);
    const serials = read?.value.split(/[,;\s]+/).filter((one) => /\d/.test(one)) ?? [];
    if (read && serials.length > 0) line.serials ??= { ...read, value: serials };
    return serials.length > 0;
  },
};

/** "2024-T3 SHEET", "4130 STEEL BAR". */
const IS_MATERIAL =
  /^(?:[1-8]\d{3}-(?:[OFW]|T\d|H\d)|\d{2,5}(?:-\d?PH|PH)?[A-Z]?\s+(?:steel|alum\w*|titanium|magnesium|stainless|cres)\b)/i;

/** A title that begins with the same word: "Material process certification". */
const NO_MATERIAL = /^(?:process\w*|test\w*|certif\w*|report|record|inspection|conform\w*|review)\b/i;

function counted(field: 'quantity' | 'accepted' | 'rejected' | 'received'): Writer {
  return (line, value, paper) => {
    const read = cell(countIn(value.passage, paper.decimal), value);
    if (read) line[field] ??= read;
    return read !== null;
  };
}

function coded(field: 'lot' | 'heat'): Writer {
  return (line, value) => {
    const read = cell(codeIn(value.passage, beginsWithDay), value);
    if (read) line[field] ??= { ...read, value: read.value.replace(/^lot[\s-]+(?=\w)/i, '') };
    return read !== null;
  };
}
