import { statedItems, type OrderingAnswers } from '@/lib/parts/ordering-answers';

import type { StatedForLines } from './content';

interface Line {
  lineNo: number;
  ordering?: OrderingAnswers | undefined;
}

/** What the order states, said once for the lines it holds for; for all lines without naming them. */
export function orderStatesOf(lines: readonly Line[]): StatedForLines[] {
  const said = new Map<string, StatedForLines>();
  for (const { lineNo, ordering = {} } of lines)
    for (const { item, says } of statedItems(ordering)) {
      const key = `${item}\n${says}`;
      const one = said.get(key) ?? { lines: [], item, says };
      one.lines.push(lineNo);
      said.set(key, one);
    }
  return [...said.values()].map((one) => (one.lines.length === lines.length ? { ...one, lines: [] } : one));
}
