import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { calledRevision } from '@/lib/trade/finishes/called-revision';
import { passivationAsOrdered } from '@/lib/trade/finishes/passivation-as-ordered';
import { passivationBath } from '@/lib/trade/finishes/passivation-bath';
import { passivationTest } from '@/lib/trade/finishes/passivation-test';
import { readDesignation } from '@/lib/trade/finishes/read-designation';
import { orderingChecklist } from '@/lib/trade/ordering/ordering-checklist';

import { limitOf, temperatureLimit } from './limit';
import { proposal, proposalInWords, type AskedLine } from './proposal';
import { question } from './question';

/** What papers of a passivation show: bath and time as called, and the test by which the lot is accepted. */
export function passivationProposals(tables: BatchTables, asked: AskedLine): ToProve[] {
  const { step } = asked;
  const isBy = (document: string) =>
    calledRevision(document, {
      specification: step.specification,
      revision: step.specificationRevision,
    }) !== null;
  if (isBy('ASTM A967')) return byA967(tables, asked);
  return isBy('AMS2700') || isBy('QQ-P-35') || isBy('AMS-QQ-P-35') ? byClass(tables, asked) : [];
}

function byA967(tables: BatchTables, { step, ordering, units }: AskedLine): ToProve[] {
  const { passivationBaths, passivationTests } = tables.requirements;
  const said = [step.classType, ...Object.values(ordering)].join(' ');
  const [, acid = '', number] = /\b(nitric|citric)\s*(\d)\b/i.exec(said) ?? [];
  const bath = passivationBath(passivationBaths, {
    acid: acid.toLowerCase() === 'citric' ? 'citric' : 'nitric',
    number: Number(number),
  });
  const test = passivationTest(passivationTests, said);
  if (!bath.ok) return testProposals(tables, test);
  const { percent, dichromatePercent, temperatureCMin, temperatureCMax, leastMin, saltSprayHours, source } =
    bath;
  const salts = dichromatePercent === undefined ? '' : `, sodium dichromate ${dichromatePercent} %`;
  return [
    ...proposalInWords(
      'Passivation bath',
      `${acid.toLowerCase()} acid, ${percent.join(' to ')} %${salts}`,
      source,
    ),
    ...proposal(
      'Passivation temperature',
      temperatureLimit({ min: temperatureCMin, max: temperatureCMax }, units),
      source,
    ),
    ...proposal('Passivation time', limitOf({ min: leastMin }, 'min'), source),
    ...testProposals(tables, test),
    ...(test.ok && test.practice === 'C'
      ? proposal('Salt spray', limitOf({ min: saltSprayHours }, 'h'), source)
      : []),
  ];
}

/** The test that is called; else the question which, with what there is to choose from. */
function testProposals(
  { requirements: { passivationTests } }: BatchTables,
  test: ReturnType<typeof passivationTest>,
): ToProve[] {
  const name = 'Passivation test';
  if (test.ok) return proposalInWords(name, `practice ${test.practice}, ${test.says}`, test.source);
  const [first] = passivationTests.rows;
  return first ? question(name, first.source, choicesOf(passivationTests.rows)) : [];
}

const choicesOf = (rows: BatchTables['requirements']['passivationTests']['rows']): string =>
  `by one practice: ${rows.map(({ practice, says }) => `${practice} ${says}`).join(', ')} or another`;

/** By AMS 2700 the class says how often a lot is tested; an old QQ-P-35 on the drawing asks for nitric acid and class 4. */
function byClass(tables: BatchTables, { step }: AskedLine): ToProve[] {
  const called = { specification: step.specification, revision: step.specificationRevision };
  const old = passivationAsOrdered(tables.route.defaults, { ...called, engineeringAllowsCitric: false });
  if (old.ok)
    return [
      ...proposalInWords(
        'Passivation bath',
        `${old.acids.join(' or ')} acid, method ${old.methods.join(' or ')}`,
        old.source,
      ),
      ...proposalInWords('Passivation test', `class ${old.testClass}`, old.source),
    ];
  const list = orderingChecklist(tables.ordering, 'AMS2700', []);
  const item = list.ok ? list.items.find((one) => one.item === 'class') : undefined;
  if (!item) return [];
  const stated = readDesignation(step.classType ?? '').class;
  if (stated !== undefined) return proposalInWords('Passivation test', `class ${stated}`, item.source);
  return item.otherwise === undefined
    ? question('Passivation test', item.source)
    : proposalInWords('Passivation test', item.otherwise, item.source);
}
