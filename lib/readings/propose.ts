import type {
  Discrepancy,
  RequirementVerdict,
  SeenCertificate,
  StatedCertificate,
} from '@/lib/evidence/certificate/certificate';
import { compare, type Comparison } from '@/lib/evidence/certificate/compare/compare';
import { pairLines, type LinePair, type PairedBy } from '@/lib/evidence/certificate/compare/pair-lines';
import type { ComparisonTables } from '@/lib/evidence/certificate/compare/tables';
import type { Fact } from '@/lib/evidence/fact';
import type { Order, Requirements } from '@/lib/evidence/order';
import type { OpenedFile } from '@/lib/evidence/page';
import type { Verdict } from '@/lib/certificates/verdict';

import { qualityOf } from './quality';
import type { AskedRequirement, BatchOrder } from './orders-of-batch';

/** What the machine would write for one requirement. A person decides. */
export interface Proposal {
  requirementId: string;
  stated: string;
  verdict: Verdict;
  why: string;
  /** The facts it rests on, by their place in the reading. */
  facts: number[];
  /** Of the weakest fact it rests on; null where it rests on none. */
  confidence: number | null;
}

/** What it would write for a line's pieces. */
export interface LineProposal {
  lineNo: number;
  pieces: number;
  facts: number[];
  why: string;
}

export interface Proposed {
  proposals: Proposal[];
  lines: LineProposal[];
  discrepancies: Discrepancy[];
  observations: string[];
}

interface Compared {
  stated: StatedCertificate;
  file: Pick<OpenedFile, 'sha256' | 'recognised' | 'pages'>;
  others: readonly StatedCertificate[];
  /** Other orders that it may speak of. */
  orders?: readonly Order[];
  seen: readonly SeenCertificate[];
  /** `YYYY-MM-DD` */
  today: string;
  /** The published ones where nothing is said. */
  tables?: ComparisonTables;
}

const VERDICT = {
  meets: 'meets',
  fails: 'does_not_meet',
  not_stated: 'not_stated',
  cannot_tell: 'cannot_tell',
} as const;

/** What every certificate is asked for beside figures: how shops word it, what speaks against it, where it stands. */
interface PaperForm {
  characteristic: RegExp;
  against: RegExp;
  fields: RegExp;
}

const PAPERS: readonly PaperForm[] = [
  {
    characteristic: /order|revision|part number/i,
    against: /^(wrong_po|wrong_batch|part_number_|revision_mismatch)/,
    fields: /^purchase_order$|^lines\[own\]\.(part_number|rev)$/,
  },
  {
    characteristic: /signature|signed/i,
    against: /^signature_missing$/,
    fields: /^(signature_present|signed_by|signer_title|certificate_date)$/,
  },
  {
    characteristic: /conformance|statement/i,
    against: /^statement_missing$/,
    fields: /^conformance_statement$/,
  },
];

/** What must be found for each word that a requirement says; the other fields are only pointed at. */
const NEEDED: readonly (readonly [RegExp, RegExp])[] = [
  [/order/i, /^purchase_order$/],
  [/revision/i, /^lines\[own\]\.rev$/],
  [/part number/i, /^lines\[own\]\.part_number$/],
  [/sign/i, /^signature_present$/],
  [/\bdated?\b/i, /^certificate_date$/],
  [/conformance|statement/i, /^conformance_statement$/],
];

/**
 * Compares a certificate with its batch and says what it would write for each requirement and line.
 *
 * Each requirement is compared by itself: two may ask for different figures of the same thing, one of the whole batch
 * and one of a line, and each has its own answer.
 */
export function propose(
  { order, requirements }: Pick<BatchOrder, 'order' | 'requirements'>,
  compared: Compared,
): Proposed {
  const known = new Map<string, Comparison>();
  /** Many lines ask for the same: each question is answered once. */
  const against = (asked: Requirements): Comparison => {
    const key = JSON.stringify(asked);
    const answer = known.get(key) ?? compare({ ...compared, order: { ...order, requirements: asked } });
    known.set(key, answer);
    return answer;
  };
  const unasked = against({});
  const answers = requirements.map((requirement) => ({
    requirement,
    answer: requirement.figures && against(requirement.figures.asked),
  }));
  const outcomes = [...known.values()];
  const discrepancies = unique(outcomes.flatMap((outcome) => outcome.discrepancies));
  const { stated } = compared;
  const { pairs } = pairLines(order, stated.lines);
  /** Rows of the certificate for a line; every row is of the whole batch. */
  const rowsOfLine = (lineNo: number | null) =>
    new Set(
      lineNo === null
        ? stated.lines.keys()
        : pairs
            .filter(({ ordered }) => ordered.line === lineNo)
            .flatMap(({ stated: rows }) => rows.map(({ line }) => stated.lines.indexOf(line))),
    );
  const facts = stated.facts.map((fact) => ({ ...fact, field: named(fact.field, stated) }));
  return {
    proposals: answers.flatMap(({ requirement, answer }) =>
      answer && requirement.figures
        ? figureProposal(requirement.id, {
            verdicts: beyond(unasked.verdicts, answer.verdicts),
            facts,
            own: placesOf(facts, requirement.figures.fields),
          })
        : paperProposal(requirement, discrepancies, ownLines(facts, rowsOfLine(requirement.lineNo))),
    ),
    lines: pairs.flatMap((pair) => lineProposal(pair, { stated, verdicts: unasked.verdicts })),
    discrepancies,
    observations: [...new Set(outcomes.flatMap((outcome) => outcome.observations))],
  };
}

/** The verdicts that a requirement adds to those that every certificate of the order gets. */
function beyond(usual: readonly RequirementVerdict[], all: readonly RequirementVerdict[]) {
  const keyOf = ({ requirement, line }: RequirementVerdict) => `${requirement} ${line}`;
  const known = new Set(usual.map(keyOf));
  return all.filter((one) => !known.has(keyOf(one)));
}

/** The worst first: a step is met when its temperature and its time are, and so is each of its cycles. */
const WORST_FIRST = ['fails', 'cannot_tell', 'not_stated', 'meets'] as const;

function figureProposal(
  requirementId: string,
  { verdicts, facts, own }: { verdicts: RequirementVerdict[]; facts: readonly Fact[]; own: number[] },
): Proposal[] {
  const worst = verdicts.toSorted(
    (one, other) => WORST_FIRST.indexOf(one.verdict) - WORST_FIRST.indexOf(other.verdict),
  )[0];
  if (!worst) return [];
  return [
    asWellAsRead({
      requirementId,
      stated: [...new Set(verdicts.flatMap(({ stated }) => stated ?? []))].join(', '),
      verdict: VERDICT[worst.verdict],
      why: worst.why,
      facts: own,
      confidence: weakest(facts, own),
    }),
  ];
}

function paperProposal(
  { id, characteristic }: AskedRequirement,
  discrepancies: readonly Discrepancy[],
  facts: readonly Fact[],
): Proposal[] {
  const paper = PAPERS.find((one) => one.characteristic.test(characteristic));
  if (!paper) return [];
  const against = discrepancies.find(({ code }) => paper.against.test(code));
  const needed = NEEDED.filter(([word]) => word.test(characteristic)).map(([, field]) =>
    placesOf(facts, field),
  );
  const unlessMissing = needed.every((places) => places.length > 0) ? 'meets' : 'not_stated';
  const own = placesOf(facts, paper.fields);
  const says = own.map((at) => facts[at]?.value).filter((value) => typeof value === 'string');
  return [
    asWellAsRead({
      requirementId: id,
      stated: [...new Set(says)].join(', '),
      verdict: against ? 'does_not_meet' : unlessMissing,
      why: against?.message ?? '',
      facts: own,
      confidence: weakest(facts, needed.flat()),
    }),
  ];
}

/** The facts with the rows that are of this line of the order named so. */
const ownLines = (facts: readonly Fact[], rows: ReadonlySet<number>): Fact[] =>
  facts.map((fact) => ({
    ...fact,
    field: fact.field.replace(/^lines\[(\d+)\]/, (counted, at: string) =>
      rows.has(Number(at)) ? 'lines[own]' : counted,
    ),
  }));

/** What was read poorly is never proposed as met. */
const asWellAsRead = (proposal: Proposal): Proposal =>
  proposal.verdict === 'meets' && proposal.confidence !== null && qualityOf(proposal.confidence) === 1
    ? { ...proposal, verdict: 'cannot_tell', why: 'It was read poorly. Look at the page.' }
    : proposal;

/** The pieces of all rows that speak of the line; a row under a number that only resembles it is a person's to decide. */
function lineProposal(
  { ordered, stated: rows }: LinePair,
  { stated, verdicts }: { stated: StatedCertificate; verdicts: readonly RequirementVerdict[] },
): LineProposal[] {
  const own = rows.filter(({ by, line }) => SURE.has(by) && line.qty_accepted !== null);
  if (own.length === 0) return [];
  const places = own.map(({ line }) => stated.lines.indexOf(line)).join('|');
  return [
    {
      lineNo: ordered.line,
      pieces: own.reduce((sum, { line }) => sum + (line.qty_accepted ?? 0), 0),
      facts: placesOf(stated.facts, new RegExp(`^lines\\[(?:${places})\\]\\.(part_number|qty_accepted)$`)),
      why:
        verdicts.find(({ requirement, line }) => line === ordered.line && /^quantity /.test(requirement))
          ?.why ?? '',
    },
  ];
}

const SURE: ReadonlySet<PairedBy> = new Set(['same', 'lookalike']);

/** A field with its cycle or reading named by step or kind instead of counted. */
function named(field: string, { cycles, readings }: StatedCertificate): string {
  return field
    .replace(/^cycles\[(\d+)\]/, (counted, at: string) => `cycles[${cycles[Number(at)]?.step ?? counted}]`)
    .replace(
      /^readings\[(\d+)\]/,
      (counted, at: string) => `readings[${readings[Number(at)]?.kind ?? counted}]`,
    );
}

const placesOf = (facts: readonly Fact[], fields: RegExp): number[] =>
  facts.flatMap(({ field }, at) => (fields.test(field) ? [at] : []));

const weakest = (facts: readonly Fact[], places: readonly number[]): number | null =>
  places.length === 0 ? null : Math.min(...places.map((at) => facts[at]?.confidence ?? 0));

function unique(discrepancies: readonly Discrepancy[]): Discrepancy[] {
  const keys = discrepancies.map((one) => `${one.code} ${one.line} ${one.message}`);
  return discrepancies.filter((_, at) => keys.indexOf(keys[at] ?? '') === at);
}
