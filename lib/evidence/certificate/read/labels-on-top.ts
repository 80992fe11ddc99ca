import { sharedAcross } from '../../layout/box';
import type { Line, Segment } from '../../layout/lines';
import type { Box } from '../../page';
import { labelAtStart } from './find-labels';

/** How much nearer a line of labels is to the values above it than to what is below, where they are its values. */
const NEARER = 0.85;

/**
 * Lines of a form whose labels stand under their values, in the order of other forms: the labels first. The words keep their
 * places on the page; the boxes of the lines and of what stands in them change places.
 */
export function labelsOnTop(lines: readonly Line[]): Line[] {
  const turned: Line[] = [...lines];
  let count = 0;
  for (let at = 1; at < turned.length; at += 1) {
    const [values, labels] = [turned[at - 1], turned[at]];
    if (
      !values ||
      !labels ||
      !isLabels(labels, count > 0) ||
      isLabels(values, false) ||
      !standUnder(values, labels)
    )
      continue;
    const next = turned[at + 1];
    const above = labels.box[1] - values.box[3];
    const below = next ? next.box[1] - labels.box[3] : Infinity;
    const anotherForm = next !== undefined && standUnder(next, labels);
    if (above > NEARER * below || (!anotherForm && above > 1.4 * labels.height)) continue;
    count += 1;
    turned[at - 1] = movedTo(labels, values.box, at - 1);
    turned[at] = movedTo(values, labels.box, at);
  }
  return turned;
}

/** Two places or more, on a form that has such lines one, and most of them labels without a value. */
function isLabels({ segments }: Line, evenOne: boolean): boolean {
  const whole = segments.filter(({ text }) => labelAtStart(text)?.whole === true).length;
  return (
    segments.length > (evenOne ? 0 : 1) &&
    whole >= 0.6 * segments.length &&
    !segments.some(({ text }) => /\d/.test(text))
  );
}

/** Each label but one at most has something of its own above it or below. */
function standUnder(values: Line, labels: Line): boolean {
  const level = (label: Segment): boolean =>
    values.segments.some(
      ({ box }) => sharedAcross(box, label.box) > 0 || Math.abs(box[0] - label.box[0]) < 2 * labels.height,
    );
  return (
    values.segments.length <= labels.segments.length + 1 &&
    labels.segments.filter(level).length >= labels.segments.length - 1 &&
    !values.segments.some(({ text }) => labelAtStart(text)?.marked === true)
  );
}

/** The line as if it stood elsewhere. */
function movedTo(line: Line, [, top, , bottom]: Box, index: number): Line {
  const moved = ({ 0: left, 2: right }: Box): Box => [left, top, right, bottom];
  return {
    ...line,
    box: moved(line.box),
    segments: line.segments.map((segment) => ({ ...segment, box: moved(segment.box), line: index })),
  };
}
