import {
  findSpecifications,
  recogniseSpecification,
  type SpecificationBody,
} from '@/lib/trade/lineage/recognise-specification';
import { successorsOf } from '@/lib/trade/lineage/successors-of';

import type { Order } from '../../order';
import type { StatedCertificate } from '../certificate';
import { lookalikeKey, plainKey } from '../match/alike';
import type { Check } from './compared';
import { cannotTell, meets, notStated, wrong, type Outcome } from './outcome';
import { revisionOrder } from './revision-order';
import type { ComparisonTables } from './tables';

interface Named {
  readonly body: SpecificationBody | null;
  /** Written one way, for comparing. */
  readonly number: string;
  readonly revision: string | null;
}

/** The work was done to the specification and the issue that were ordered. */
export const followsSpecification: Check = ({ stated, order, isRecognised, tables }) => {
  if (!order.spec) return [];
  const ordered = named(order.spec, order.spec_rev ?? null);
  const requirement = `specification ${ordered.number}`;
  const asked = { requirement, ordered: sayOrdered(order) };
  if (stated.specification === null) return [notStated(asked)];
  const all = allNamed(stated.specification, stated.specification_revision);
  const own = all.find(({ number }) => isSameNumber(number, ordered.number, isRecognised));
  const says = { ...asked, stated: sayStated(stated) };
  if (own) return [meets(says, 'It is the one ordered.'), ...revisionOutcome(order, ordered, own)];
  return [otherSpecification(ordered.number, all, { ...says, lineage: tables.lineage })];
};

const isSameNumber = (one: string, other: string, isRecognised: boolean): boolean =>
  plainKey(one) === plainKey(other) || (isRecognised && lookalikeKey(one) === lookalikeKey(other));

const sayOrdered = ({ spec, spec_rev }: Order): string =>
  `${spec ?? ''}${spec_rev ? ` Rev ${spec_rev}` : ''}`;
const sayStated = ({ specification, specification_revision }: StatedCertificate): string =>
  `${specification ?? ''}${specification_revision ? ` Rev ${specification_revision}` : ''}`;

const COMPANY_ISSUE = /[\s,(]*\b(?:rev(?:ision)?|issue)\b[.:\s]*([A-Z0-9-]{1,4})\)?\s*$/i;

function named(written: string, revision: string | null): Named {
  const known = recogniseSpecification(written);
  const given = revision?.replace(/^\s*(?:rev(?:ision)?|issue)\b[.:\s]*/i, '').trim() || null;
  if (known) return { body: known.body, number: known.number, revision: known.revision ?? given };
  const own = COMPANY_ISSUE.exec(written)?.[1] ?? null;
  return { body: null, number: written.replace(COMPANY_ISSUE, '').trim(), revision: own ?? given };
}

/** A certificate may name several: that of the work, that of the furnace's survey. The first goes with the revision. */
function allNamed(written: string, revision: string | null): Named[] {
  const found = findSpecifications(written);
  if (found.length < 2) return [named(written, revision)];
  return found.map(({ body, number, revision: own }, index) => ({
    body,
    number,
    revision: own ?? (index === 0 ? revision : null),
  }));
}

function otherSpecification(
  ordered: string,
  all: readonly Named[],
  {
    lineage,
    ...asked
  }: { requirement: string; ordered: string; stated: string } & Pick<ComparisonTables, 'lineage'>,
): Outcome {
  const old = all.find(({ number }) => comesAfter(lineage, ordered, number));
  if (old)
    return wrong(
      'superseded_specification',
      asked,
      `The certificate names ${asked.stated}; ${ordered}, which was ordered, has taken its place.`,
    );
  const later = all.find(({ number }) => comesAfter(lineage, number, ordered));
  const note = later ? ` It has taken the place of ${ordered}, but the order names the earlier one.` : '';
  return wrong(
    'wrong_specification',
    asked,
    `The order names ${asked.ordered}, the certificate ${asked.stated}.${note}`,
    later ? 'check' : 'blocks',
  );
}

function comesAfter(lineage: ComparisonTables['lineage'], later: string, earlier: string): boolean {
  const found = successorsOf(lineage, earlier, null);
  return found.ok && found.successors.some(({ number }) => number === later);
}

const BY_YEAR: ReadonlySet<SpecificationBody | null> = new Set(['ASTM', 'ISO', 'EN', 'ANSI'] as const);

function revisionOutcome(order: Order, ordered: Named, stated: Named): Outcome[] {
  if (ordered.revision === null) return [];
  const asked = {
    requirement: `${ordered.number} revision ${ordered.revision}`,
    ordered: sayOrdered(order),
    stated: stated.revision,
  };
  if (stated.revision === null) return [notStated(asked, 'The certificate names no revision.')];
  const says = `The order names revision ${ordered.revision} of ${ordered.number}, the certificate revision ${stated.revision}`;
  switch (revisionOrder(stated.revision, ordered.revision, BY_YEAR.has(ordered.body))) {
    case 'same':
      return [meets(asked, 'It is the revision ordered.')];
    case 'earlier':
      return [wrong('old_spec_revision', asked, `${says}, which is older.`)];
    case 'later':
      return [wrong('spec_revision_mismatch', asked, `${says}, which is later.`, 'check')];
    case 'differs':
      return [wrong('spec_revision_mismatch', asked, `${says}.`, 'check')];
  }
}

/** The work is what was ordered; asked only where no specification says so. */
export const isOrderedProcess: Check = ({ stated, order }) => {
  const requirement = `process ${order.process.replaceAll('_', ' ')}`;
  const asked = { requirement, ordered: order.process, stated: stated.process };
  if (stated.process === null) return [notStated(asked)];
  if (stated.process === order.process) return [meets(asked, 'It is the process ordered.')];
  const isNamed = !!order.spec && stated.specification !== null;
  if (isNamed || familyOf(stated.process) === familyOf(order.process))
    return [cannotTell(asked, 'The certificate puts it in other words; the specification decides.')];
  return [
    wrong(
      'wrong_process',
      asked,
      `The order asks for ${order.process.replaceAll('_', ' ')}, the certificate is for ${stated.process.replaceAll('_', ' ')}.`,
      'check',
    ),
  ];
};

const FAMILIES: readonly (readonly [RegExp, string])[] = [
  [/heat_treat|age|anneal|harden|temper|stress_relief|normalize/, 'heat treatment'],
  [/plate|anodize|film|passivation|phosphate/, 'finish'],
  [/penetrant|magnetic|radiography|ultrasonic/, 'inspection'],
];
const familyOf = (process: string): string =>
  FAMILIES.find(([pattern]) => pattern.test(process))?.[1] ?? process;
