import type { CheckedLine } from './check';

/** Lines of one part at one step ask the same: answered once for all of them, however many lines there are. */
export function oncePerStep<Answer>(answer: (line: CheckedLine) => Answer): (line: CheckedLine) => Answer {
  const known = new Map<string, { answer: Answer }>();
  return (line) => {
    const found = known.get(line.stepId) ?? { answer: answer(line) };
    known.set(line.stepId, found);
    return found.answer;
  };
}
