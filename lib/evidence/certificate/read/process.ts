import type { Process } from '../../../trade/process';
import { spotIn, type Passage } from '../../layout/passage';
import type { Candidate } from './candidates';
import type { Paper } from './paper';
import { LEGAL } from './processor';
import { SAID_AS } from './process-signs';
import type { SpecificationRead } from './specification';

/**
 * The process that the certificate is of: what the specification orders, what a label or the title says, what the text
 * speaks of, by weight.
 */
export function processesOf(
  paper: Paper,
  specification: Candidate<SpecificationRead> | null,
): Candidate<Process>[] {
  const found: Candidate<Process>[] = [];
  if (specification?.value.process)
    found.push({
      value: specification.value.process,
      spot: specification.spot,
      trust: 0.93 * (0.6 + 0.4 * specification.trust),
    });
  for (const { key, values } of paper.answers)
    if (key === 'process' || key === 'test' || key === 'method')
      for (const { passage } of values.slice(0, 1))
        found.push(...saidIn(passage, key === 'process' ? 0.85 : 0.6));
  for (const paragraph of paper.paragraphs)
    if (!isFirm(paragraph.text)) found.push(...saidIn(paragraph, isTitle(paragraph.text) ? 0.8 : 0.45));
  return found;
}

/** What a firm is called is not what it did. */
const isFirm = (text: string): boolean => LEGAL.test(text) && text.length < 90;

const isTitle = (text: string): boolean => text.length < 70 && !/[.;]\s|:/.test(text);

function saidIn(passage: Passage, trust: number): Candidate<Process>[] {
  return SAID_AS.flatMap(([pattern, value, weight]) => {
    const match = pattern.exec(passage.text);
    const spot = match && spotIn(passage, match.index, match.index + match[0].length);
    return spot ? [{ value, spot, trust: trust * weight }] : [];
  });
}
