import { sharedAcross } from '../layout/box';
import type { Line, Segment } from '../layout/lines';
import { joined, passageFrom, type Passage } from '../layout/passage';
import { invoiceLabelAt, type InvoiceLabel } from './labels';

export interface InvoiceAnswer {
  readonly label: InvoiceLabel;
  /** What may be its value, the likeliest first: behind it, to its right, under it. */
  readonly values: readonly Passage[];
}

/** Every label of an invoice's lines with what stands for it. */
export function askedOn(lines: readonly Line[]): InvoiceAnswer[] {
  return lines.flatMap((line, index) =>
    line.segments.flatMap((segment, place): InvoiceAnswer[] =>
      labelsWithin(segment).map(({ label, end, until }) => {
        const same = passageFrom(segment, end, until);
        const right = line.segments.slice(place + 1).filter(({ text }) => invoiceLabelAt(text) === null);
        const next = right[0] && right[0] === line.segments[place + 1] ? [right[0]] : [];
        const below = belowIt(segment, lines.slice(index + 1, index + 3));
        const values = /[\p{L}\p{N}]/u.test(same.text) ? [same] : [...next, ...below];
        return {
          label,
          values: next.length > 0 && values[0] === same ? [...values, joined([same, ...next])] : values,
        };
      }),
    ),
  );
}

/** The label that a segment begins with, and those further on behind a wider gap or a comma. */
function labelsWithin({ text }: Segment): { label: InvoiceLabel; end: number; until: number }[] {
  const starts = [
    0,
    ...[...text.matchAll(/(?:[,;|•·]\s*|\s{1,})(?=\p{L})/gu)].map(({ 0: gap, index }) => index + gap.length),
  ];
  const found = starts.flatMap((start) => {
    const at = invoiceLabelAt(text.slice(start));
    // Within a sentence only what a colon or a number sign follows is a label.
    const isMarked = at !== null && /[:#]\s*$/.test(text.slice(start, start + at.end));
    return at && (start === 0 || isMarked) ? [{ label: at.label, start, end: start + at.end }] : [];
  });
  const apart = found.filter(({ start }, index) => index === 0 || start >= (found[index - 1]?.end ?? 0));
  return apart.map(({ label, end }, index) => ({
    label,
    end,
    until: apart[index + 1]?.start ?? text.length,
  }));
}

function belowIt(segment: Segment, following: readonly Line[]): Passage[] {
  const height = segment.box[3] - segment.box[1];
  const [under] = following
    .filter(({ box }) => box[1] - segment.box[3] < 2.6 * height)
    .flatMap(({ segments }) => segments.filter(({ box }) => sharedAcross(box, segment.box) > 0));
  return under && invoiceLabelAt(under.text) === null ? [under] : [];
}
