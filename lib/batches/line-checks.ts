import type { Check } from './check';
import { OVERRIDE } from './finding';
import { isSameStep, stepWords } from './step-asked';

export const hasLines: Check = {
  met: 'it has lines',
  look: ({ lines, batch }) =>
    lines.length > 0
      ? []
      : [
          {
            code: 'empty_batch',
            level: 'stop',
            subject: '',
            sentence: 'Nothing is in it.',
            rest: `${batch.number} has no line. Add a lot that waits for a step.`,
            waysOut: [{ way: 'add_lot', says: 'Add a lot' }],
          },
        ],
};

export const isOneStep: Check = {
  met: 'every line waits for this one step',
  look: ({ batch, lines }) =>
    lines
      .filter((line) => !isSameStep(line.step, batch))
      .map((line) => ({
        code: 'line_of_other_step',
        level: 'stop' as const,
        subject: line.id,
        sentence: `Line ${line.lineNo} is of another step.`,
        rest: `The route of ${line.partNumber} rev ${line.partRevision} says ${stepWords(line.step)}; this batch is ${stepWords(batch)}.`,
        source: `Route of ${line.partNumber}`,
        waysOut: [
          { way: 'take_out_line' as const, says: `Take line ${line.lineNo} out`, lineId: line.id },
          OVERRIDE,
        ],
      })),
};

export const isProvable: Check = {
  met: 'each line says what must be proved',
  look: ({ batch, lines }) =>
    batch.requirements > 0
      ? []
      : lines
          .filter((line) => line.requirements === 0)
          .map((line) => ({
            code: 'no_requirement',
            level: 'warn' as const,
            subject: line.id,
            sentence: `Line ${line.lineNo} asks for no proof.`,
            rest: 'Nothing will be compared when its certificate comes.',
            source: `Route of ${line.partNumber}, step as drawn`,
            waysOut: [{ way: 'set_requirements' as const, says: 'Say what must be proved', lineId: line.id }],
          })),
};

export const isCurrent: Check = {
  met: 'no drawing is superseded',
  look: ({ lines }) =>
    lines
      .filter((line) => line.partSuperseded)
      .map((line) => ({
        code: 'part_superseded',
        level: 'warn' as const,
        subject: line.id,
        sentence: `Line ${line.lineNo} is made to a superseded drawing.`,
        rest: `A later revision of ${line.partNumber} than ${line.partRevision} exists.`,
        source: `Revisions of ${line.partNumber}`,
        waysOut: [{ way: 'take_out_line' as const, says: `Take line ${line.lineNo} out`, lineId: line.id }],
      })),
};
