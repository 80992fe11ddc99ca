import { routePartOf } from '@/lib/parts/route-part-of';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { checkRoute } from '@/lib/trade/route/check-route';
import type { RouteFinding } from '@/lib/trade/route/route';

import type { Check, CheckedLine, CheckFacts } from './check';
import { OVERRIDE, type Finding } from './finding';
import { metalOf } from './metal-of';
import { oncePerStep } from './once-per-step';
import { ROUTE_RULE_WORDS } from './route-rule-words';
import { citing } from './source-words';

/** What the rules of the trade have against this step where it stands in the route of its part. */
export const standsInOrder: Check = {
  met: 'the step stands where it belongs in each route',
  look({ tables, lines, batch }) {
    const answer = oncePerStep((line) => aboutThisStep(tables, line), routeOf);
    const warned = new Map<string, { finding: RouteFinding; lines: CheckedLine[] }>();
    const stops: Finding[] = [];
    for (const line of lines)
      for (const finding of answer(line)) {
        if (finding.rule === 'bake_after_plating' && asksForBake(batch, line)) continue;
        if (finding.severity === 'blocker') stops.push(stopOf(line, finding));
        else {
          const known = warned.get(finding.rule) ?? { finding, lines: [] };
          known.lines.push(line);
          warned.set(finding.rule, known);
        }
      }
    return [...stops, ...[...warned.values()].map(warningOf)];
  },
};

function aboutThisStep(tables: BatchTables, { part, stepId }: CheckedLine): RouteFinding[] {
  const found = metalOf(tables, part);
  const at = part.route.findIndex(({ id }) => id === stepId);
  if (found.known !== 'yes') return [];
  const route = part.route.map(({ specificationRevision, ...step }) => ({
    ...step,
    revision: specificationRevision,
  }));
  const routePart = routePartOf(tables.phConditions, found.material, part.endCondition);
  return checkRoute(tables.route, route, routePart).filter(
    ({ severity, steps }) => severity !== 'note' && steps.includes(at),
  );
}

/** All that the rules look at: parts of one metal with one route are asked about once. */
const routeOf = ({ part: { alloy, form, clad, endCondition, route }, stepId }: CheckedLine): string =>
  JSON.stringify([
    ...[alloy, form, clad, endCondition],
    route.map((step) => [
      ...[step.process, step.specification, step.specificationRevision, step.classType],
      ...[step.conditionBefore, step.targetCondition, step.id === stepId],
    ]),
  ]);

/** Platers bake what they plate: then the order asks for it with the plating, and the route has no step of its own. */
const asksForBake = (batch: CheckFacts['batch'], line: CheckedLine): boolean =>
  [...batch.characteristics, ...line.characteristics].some((asked) => /\bbak(?:e|ed|ing)\b/i.test(asked));

const wordsOf = ({ rule }: RouteFinding): string => ROUTE_RULE_WORDS[rule] ?? rule.replaceAll('_', ' ');

const stopOf = (line: CheckedLine, finding: RouteFinding): Finding => ({
  code: `route_${finding.rule}`,
  level: 'stop',
  subject: line.id,
  sentence: `Line ${line.lineNo}: the route of ${line.partNumber} is not in order.`,
  rest: `${sentence(wordsOf(finding))} Change the route, or take the line out.`,
  ...citing(finding.source),
  waysOut: [{ way: 'take_out_line', says: `Take line ${line.lineNo} out`, lineId: line.id }, OVERRIDE],
});

function warningOf({ finding, lines }: { finding: RouteFinding; lines: readonly CheckedLine[] }): Finding {
  const numbers = lines.map(({ lineNo }) => lineNo).join(', ');
  return {
    code: `route_${finding.rule}`,
    level: 'warn',
    subject: '',
    sentence: `${lines.length === 1 ? `Line ${numbers}` : `Lines ${numbers}`}: look at the route.`,
    rest: sentence(wordsOf(finding)),
    ...citing(finding.source),
    waysOut: [],
  };
}

const sentence = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;
