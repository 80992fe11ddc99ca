import { fitting } from './answers';
import type { Candidate } from './candidates';
import { codeIn, countIn, wordsIn } from './codes';
import { beginsWithDay } from './identity';
import type { Paper } from './paper';

/** Furnace or load as the document names it. */
export function equipment(paper: Paper, key: 'furnace' | 'load'): Candidate<string>[] {
  return paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== key) return [];
    const found = fitting(answer, (passage) =>
      passage.words.length > 4 ? null : (codeIn(passage, beginsWithDay) ?? wordsIn(passage)),
    );
    return found ? [{ ...found, trust: found.trust * 0.95 }] : [];
  });
}

/** How many pieces were tested. */
export function sampleSizes(paper: Paper): Candidate<number>[] {
  return paper.answers.flatMap((answer): Candidate<number>[] => {
    if (answer.key !== 'sample_size') return [];
    const found = fitting(answer, (passage) => countIn(passage, paper.decimal));
    return found ? [found] : [];
  });
}
