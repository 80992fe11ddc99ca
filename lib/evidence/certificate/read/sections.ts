import { sharedAcross } from '../../layout/box';
import type { Line, Segment } from '../../layout/lines';
import { labelAtStart, type FoundLabel } from './find-labels';
import type { LabelKey } from './labels';
import { stepsIn, type Step } from './steps';

/** What is asked of a step left of a label on its line is asked of the label's step too, when its heading is nearer. */
export function sectionBeside(
  lines: readonly Line[],
  index: number,
  segment: Segment,
  left: readonly { readonly segment: Segment; readonly labels: readonly FoundLabel[] }[],
): Step | null {
  const own = headingAbove(lines, index, segment);
  const beside = left
    .filter(({ labels }) => labels.some(({ key }) => OF_A_STEP.has(key)))
    .map((one) => headingAbove(lines, index, one.segment))
    .reduce((near, one) => (one.line > near.line ? one : near), own);
  return beside.step;
}

const OF_A_STEP: ReadonlySet<LabelKey> = new Set(['temperature', 'minutes', 'time_in', 'time_out', 'date']);

/** The step that the nearest heading above speaks of. */
export const sectionOf = (lines: readonly Line[], index: number, segment: Segment): Step | null =>
  headingAbove(lines, index, segment).step;

interface HeadingAbove {
  readonly step: Step | null;
  /** Index of its line; -1 where there is none. */
  readonly line: number;
}

function headingAbove(lines: readonly Line[], index: number, segment: Segment): HeadingAbove {
  for (let above = index; above >= 0; above -= 1) {
    const line = lines[above];
    // A choice of processes is no heading.
    if (!line || line.segments.filter(({ text }) => stepsIn(text).length > 0).length > 2) continue;
    for (const other of line.segments) {
      if (
        other === segment ||
        !(isHeading(other, line, above === index ? segment : null) || beginsWithStep(other, line))
      )
        continue;
      if (answersLabel(other, line)) continue;
      const beside = above !== index && sharedAcross(other.box, segment.box) <= 0 && line.segments.length > 1;
      if (beside) continue;
      const steps = stepsIn(other.text);
      const [step] = steps;
      if (step) return { step: steps.length === 1 ? step.step : null, line: above };
      if (line.segments.length === 1) return { step: null, line: above };
    }
  }
  return { step: null, line: -1 };
}

/** "Tempering 482 °C (furnace 1)", and what is asked of it beside or below. */
function beginsWithStep(other: Segment, { segments }: Line): boolean {
  const [step, second] = stepsIn(other.text);
  return (
    segments[0] === other &&
    step?.start === 0 &&
    !second &&
    other.words.length < 13 &&
    /\d\s*(?:°|deg|F\b|C\b|hours?\b|hrs?\b|h\b|min\b)/i.test(other.text)
  );
}

/** Words right of a label are its value: the name of a process says what the certificate is of, not where a part begins. */
function answersLabel(other: Segment, { segments }: Line): boolean {
  const before = segments[segments.indexOf(other) - 1];
  return before !== undefined && labelAtStart(before.text)?.whole === true;
}

/** A few words without figures that are no label of a value beside them. Left of the label on its own line also counts. */
function isHeading(other: Segment, line: Line, onLineOf: Segment | null): boolean {
  if (onLineOf && other.box[0] > onLineOf.box[0]) return false;
  const text = other.text.trim().replace(/^(?:section |part )?(?:\d{1,2}|[A-Z])[.)\s]\s*/i, '');
  if (/\d{2}/.test(text) || other.words.length > 7) return false;
  const label = labelAtStart(text);
  const steps = stepsIn(text);
  if (steps.length > 0)
    return (
      label === null ||
      label.key === 'process' ||
      label.key === 'bake' ||
      label.key === 'condition' ||
      !label.marked
    );
  return label === null && line.segments.length === 1 && /^[\p{L}\s&/,.:()\-–]+$/u.test(text);
}
