import type { Discrepancy, SeenCertificate, StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { compare } from '@/lib/evidence/certificate/compare/compare';
import type { Fact } from '@/lib/evidence/fact';
import type { Order } from '@/lib/evidence/order';
import type { OpenedFile } from '@/lib/evidence/page';
import type { Verdict } from '@/lib/certificates/verdict';

import { qualityOf } from './quality';
import { askedTogether, type AskedRequirement, type BatchOrder } from './orders-of-batch';

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
  seen: readonly SeenCertificate[];
  /** `YYYY-MM-DD` */
  today: string;
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
  /** Those of the fields whose reading decides; all of them where it is not said. */
  decide?: RegExp;
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
    decide: /^(signature_present|certificate_date)$/,
  },
  {
    characteristic: /conformance|statement/i,
    against: /^statement_missing$/,
    fields: /^conformance_statement$/,
  },
];

/**
 * Compares a certificate with its batch and says what it would write for each requirement and line.
 *
 * Lines that must prove different things are compared apart, each with what is asked of it.
 */
export function propose({ order, requirements }: BatchOrder, compared: Compared): Proposed {
  const groups = groupsOf(order, requirements);
  const outcomes = groups.map((group) => ({
    group,
    ...compare({ ...compared, order: { ...order, requirements: askedTogether(group.requirements) } }),
  }));
  const discrepancies = unique(outcomes.flatMap((outcome) => outcome.discrepancies));
  const facts = compared.stated.facts.map((fact) => ({ ...fact, field: named(fact.field, compared.stated) }));
  const proposals = outcomes.flatMap(({ group, verdicts }) =>
    group.requirements.flatMap((requirement): Proposal[] => {
      const { figures } = requirement;
      if (!figures)
        return paperProposal(requirement, discrepancies, ownLines(facts, order, requirement.lineNo));
      const verdict = verdicts.find(
        (one) =>
          figures.answeredBy.test(one.requirement) && (one.line === null || one.line === requirement.lineNo),
      );
      if (!verdict) return [];
      const own = placesOf(facts, figures.fields);
      return [
        asWellAsRead({
          requirementId: requirement.id,
          stated: verdict.stated ?? '',
          verdict: VERDICT[verdict.verdict],
          why: verdict.why,
          facts: own,
          confidence: weakest(facts, own),
        }),
      ];
    }),
  );
  return {
    proposals: proposals.filter(
      (one, at) => proposals.findIndex(({ requirementId }) => requirementId === one.requirementId) === at,
    ),
    lines: order.lines.flatMap((line) => lineProposal(line, compared.stated)),
    discrepancies,
    observations: [...new Set(outcomes.flatMap((outcome) => outcome.observations))],
  };
}

interface Group {
  requirements: AskedRequirement[];
}

/** Lines of which the same is asked, with what is asked of the whole batch. */
function groupsOf(order: Order, requirements: readonly AskedRequirement[]): Group[] {
  const ofBatch = requirements.filter(({ lineNo }) => lineNo === null);
  const byAsked = new Map<string, Group>();
  for (const { line } of order.lines) {
    const own = requirements.filter(({ lineNo }) => lineNo === line);
    const key = JSON.stringify(askedTogether([...ofBatch, ...own]));
    const group = byAsked.get(key) ?? { requirements: [...ofBatch] };
    group.requirements.push(...own);
    byAsked.set(key, group);
  }
  return [...byAsked.values()];
}

function paperProposal(
  { id, characteristic }: AskedRequirement,
  discrepancies: readonly Discrepancy[],
  facts: readonly Fact[],
): Proposal[] {
  const paper = PAPERS.find((one) => one.characteristic.test(characteristic));
  if (!paper) return [];
  const against = discrepancies.find(({ code }) => paper.against.test(code));
  const own = placesOf(facts, paper.fields);
  const says = own.map((at) => facts[at]?.value).filter((value) => typeof value === 'string');
  return [
    asWellAsRead({
      requirementId: id,
      stated: [...new Set(says)].join(', '),
      verdict: paperVerdict(against !== undefined, own.length > 0),
      why: against?.message ?? '',
      facts: own,
      confidence: weakest(facts, paper.decide ? placesOf(facts, paper.decide) : own),
    }),
  ];
}

function paperVerdict(isAgainst: boolean, isStated: boolean): Verdict {
  if (isAgainst) return 'does_not_meet';
  return isStated ? 'meets' : 'not_stated';
}

/** The facts with the lines that are of this line of the order named so; of the whole batch all are. */
function ownLines(facts: readonly Fact[], { lines }: Order, lineNo: number | null): Fact[] {
  const part = lines.find(({ line }) => line === lineNo)?.part_number;
  const own = new Set(
    facts.flatMap(({ field, value }) => {
      const at = /^lines\[(\d+)\]\.part_number$/.exec(field)?.[1];
      return at !== undefined && (part === undefined || value === part) ? [at] : [];
    }),
  );
  return facts.map((fact) => ({
    ...fact,
    field: fact.field.replace(/^lines\[(\d+)\]/, (counted, at: string) =>
      own.has(at) ? 'lines[own]' : counted,
    ),
  }));
}

/** What was read poorly is never proposed as met. */
const asWellAsRead = (proposal: Proposal): Proposal =>
  proposal.verdict === 'meets' && proposal.confidence !== null && qualityOf(proposal.confidence) === 1
    ? { ...proposal, verdict: 'cannot_tell', why: 'It was read poorly. Look at the page.' }
    : proposal;

function lineProposal(line: Order['lines'][number], stated: StatedCertificate): LineProposal[] {
  const at = stated.lines.findIndex(({ part_number }) => part_number === line.part_number);
  const pieces = stated.lines[at]?.qty_accepted;
  if (pieces == null) return [];
  return [
    {
      lineNo: line.line,
      pieces,
      facts: placesOf(stated.facts, new RegExp(`^lines\\[${at}\\]\\.(part_number|qty_accepted)$`)),
    },
  ];
}

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
