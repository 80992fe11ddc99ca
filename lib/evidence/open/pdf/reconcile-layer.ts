import type { Box, HiddenText, Page, Word } from '../../page';
import { areaOf, boxThroughProjection, intersection } from '../box';
import { inverseOf } from '../picture/projection';

/** Letters that a copier's reading mixes up are compared as they are: which is right only the picture tells. */
const plain = (text: string) => text.replace(/[\s.,:;'"‘’“”|_]/g, '');
/** Of the smaller of two boxes, the share that must be common. */
const SAME_PLACE = 0.5;
/** A word of the layer this far, in points, from any ink read on the page is nowhere in the picture. */
const NEAR = 6;

/**
 * Compares what was read from a page's picture with the text layer that came with it.
 *
 * Where both agree the word is certain. Where they differ the picture is right. What the layer says at places where the
 * picture shows no print is text that nobody can see.
 */
export function reconcileLayer(recognised: Page, layer: readonly HiddenText[]): Page {
  const { asFiled } = recognised;
  const onPage = asFiled ? inverseOf(asFiled.projection) : null;
  const placed = layer.map((word) => ({
    ...word,
    box: onPage ? boxThroughProjection(onPage, word.box) : word.box,
  }));
  const words = recognised.words.map((word): Word => {
    const same = placed.some(
      (other) => plain(other.text) === plain(word.text) && sharePlace(other.box, word.box),
    );
    return same ? { ...word, confidence: 1 } : word;
  });
  const print = [...recognised.words, ...recognised.marks].map(({ box }) => box);
  const unseen = placed.filter(
    ({ box, text }) => plain(text) !== '' && !print.some((other) => isNear(box, other)),
  );
  return { ...recognised, words, hidden: [...recognised.hidden, ...unseen] };
}

function sharePlace(a: Box, b: Box): boolean {
  return areaOf(intersection(a, b)) > SAME_PLACE * Math.min(areaOf(a), areaOf(b));
}

const isNear = (a: Box, b: Box) =>
  a[0] - NEAR < b[2] && b[0] - NEAR < a[2] && a[1] - NEAR < b[3] && b[1] - NEAR < a[3];
