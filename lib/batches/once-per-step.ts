import type { CheckedLine } from './check';

/** Lines that ask the same are answered once, however many there are: lines of one part at one step, if nothing else is said. */
export function oncePerStep<Answer>(
  answer: (line: CheckedLine) => Answer,
  sameFor: (line: CheckedLine) => string = ({ stepId }) => stepId,
): (line: CheckedLine) => Answer {
  const known = new Map<string, { answer: Answer }>();
  return (line) => {
    const key = sameFor(line);
    const found = known.get(key) ?? { answer: answer(line) };
    known.set(key, found);
    return found.answer;
  };
}
