import type { OrderLine } from '../../order';
import type { CertificateLine } from '../certificate';
import { likeness, lookalikeKey, mayBeMisread, plainKey } from '../match/alike';
import { namesOrder } from '../match/same-order-number';
import type { Check, Compared } from './compared';
import { cannotTell, doubtful, meets, notStated, observed, wrong, type Outcome } from './outcome';
import { isOnThePage, transposedOnThePage } from './on-the-page';
import { piecesOf, type LinePair, type StatedLine } from './pair-lines';

/** Each ordered part is on the certificate under its number, and nothing else is. */
export const showsEachPart: Check = (compared) => {
  const { pairs, unknown } = compared.pairs;
  // What was taken for a part number may be any other number where a line was not read as what it is.
  const unread = pairs.filter((pair) => isUnread(pair, compared)).length;
  const parts = pairs.flatMap((pair) => partOutcome(pair, compared));
  const areAllMissing = parts.every((part) => part.wrong?.code === 'part_number_missing');
  return [
    ...(compared.stated.lines.length === 0 && areAllMissing ? [noPartsListed(compared)] : parts),
    // A number without pieces, revision or lot certifies nothing; mostly it is no part.
    ...unknown
      .filter((line) => piecesOf(line) !== null || line.rev !== null || line.lot !== null)
      .slice(unread)
      .map((line) => unknownPart(line, compared)),
  ];
};

/** The ordered number stands on the page, and no line was read with it. */
const isUnread = ({ ordered, stated }: LinePair, { pages }: Compared): boolean =>
  !stated.some(({ by }) => by === 'same' || by === 'lookalike') && isOnThePage(ordered.part_number, pages);

function noPartsListed({ order: { lines } }: Compared): Outcome {
  const [only] = lines;
  const numbers = lines.map(({ part_number }) => part_number).join(', ');
  return wrong(
    'part_number_missing',
    {
      requirement: `part number ${numbers}`,
      line: lines.length === 1 ? (only?.line ?? null) : null,
      ordered: numbers,
    },
    'The certificate lists no part numbers.',
  );
}

function partOutcome(pair: LinePair, compared: Compared): Outcome[] {
  const { ordered, stated } = pair;
  const { others, isRecognised } = compared;
  const asked = {
    requirement: `part number ${ordered.part_number}`,
    line: ordered.line,
    ordered: ordered.part_number,
  };
  if (isUnread(pair, compared))
    return [cannotTell(asked, `${ordered.part_number} stands on the page, but its line could not be read.`)];
  if (stated.length > 0) return stated.slice(0, 1).map((line) => namedPart(ordered, line, isRecognised));
  const isElsewhere = others.some(({ lines }) => lines.some((line) => isSamePart(line, ordered)));
  if (isElsewhere) return [meets(asked, 'It stands on another certificate of this order.')];
  const numbers = compared.order.lines.map(({ part_number }) => part_number);
  const transposed = transposedOnThePage(ordered.part_number, numbers, compared.pages);
  if (transposed !== null) return [transposedPart({ ...asked, stated: transposed })];
  return [
    wrong(
      'part_number_missing',
      asked,
      `Line ${ordered.line}, ${ordered.part_number}, is not on the certificate.`,
    ),
  ];
}

const isSamePart = ({ part_number }: CertificateLine, ordered: OrderLine): boolean =>
  part_number !== null && plainKey(part_number) === plainKey(ordered.part_number);

const transposedPart = (asked: {
  requirement: string;
  line: number;
  ordered: string;
  stated: string | null;
}) =>
  wrong(
    'part_number_transposed',
    asked,
    `The certificate says ${asked.stated}, the order ${asked.ordered}: two characters changed places.`,
  );

function namedPart(ordered: OrderLine, { line, by }: StatedLine, isRecognised: boolean): Outcome {
  const asked = {
    requirement: `part number ${ordered.part_number}`,
    line: ordered.line,
    ordered: ordered.part_number,
    stated: line.part_number,
  };
  if (by === 'near' && isRecognised && mayBeMisread(line.part_number ?? '', ordered.part_number))
    return cannotTell(
      asked,
      `${line.part_number} was recognised where the order has ${ordered.part_number}: look at the page.`,
    );
  switch (by) {
    case 'same':
      return meets(asked, 'It is the number ordered.');
    case 'lookalike':
      return meets(
        asked,
        `${line.part_number} differs from ${ordered.part_number} only in characters that look alike.`,
      );
    case 'transposed':
      return transposedPart(asked);
    case 'near':
    case 'only_one_left':
      return wrong(
        'part_number_unknown',
        asked,
        `The certificate says ${line.part_number} where the order has ${ordered.part_number}.${isRecognised ? ' It may be misread: look at the page.' : ''}`,
        isRecognised ? 'check' : 'blocks',
      );
    case 'no_number':
      return doubtful(
        'part_number_missing',
        asked,
        `The certificate states no part number for line ${ordered.line}, ${ordered.part_number}.`,
      );
  }
}

function unknownPart(line: CertificateLine, { order, orders, stated }: Compared): Outcome {
  const number = line.part_number ?? 'without a number';
  const other = orders.find(
    (one) => one.batch !== order.batch && one.lines.some((ordered) => isSamePart(line, ordered)),
  );
  if (other && stated.purchase_order !== null && namesOrder(stated.purchase_order, other.po))
    return observed(`The certificate also covers ${number} of batch ${other.batch}, order ${other.po}.`);
  const whose = other ? ` It is on order ${other.po}, batch ${other.batch}.` : '';
  return wrong(
    'part_number_unknown',
    { requirement: null, stated: line.part_number },
    `Part ${number} on the certificate is not on the order.${whose}`,
    'check',
  );
}

/** The part's revision, the lot and the serial numbers are those that were sent. */
export const hasRevisionLotAndSerials: Check = ({ pairs, isRecognised }) =>
  pairs.pairs.flatMap(({ ordered, stated }) =>
    stated.length === 0
      ? []
      : [
          ...revisionOutcome(ordered, stated, isRecognised),
          ...lotOutcome(ordered, stated, isRecognised),
          ...serialOutcome(ordered, stated),
        ],
  );

/** No revision, a dash and "N/C" say the same. */
const revisionKey = (written: string): string => {
  const key = written
    .toUpperCase()
    .replace(/\b(?:REVISION|REV|ISSUE)\b\.?/, '')
    .replace(/[^A-Z0-9]/g, '');
  return /^(?:NC|NONE|NA|ORIG|ORIGINAL|NEW)$/.test(key) ? '' : key;
};

/** What recognition may have misread is not held against the certificate. */
const isSameKey = (one: string, other: string, isRecognised: boolean): boolean =>
  one === other || (isRecognised && lookalikeKey(one) === lookalikeKey(other));

function revisionOutcome(ordered: OrderLine, stated: readonly StatedLine[], isRecognised: boolean) {
  if (!ordered.rev) return [];
  const asked = { requirement: `revision ${ordered.rev}`, line: ordered.line, ordered: ordered.rev };
  const written = stated.flatMap(({ line }) => line.rev ?? []);
  const [first] = written;
  if (first === undefined) return [notStated(asked)];
  const key = revisionKey(ordered.rev);
  const other = written.find((rev) => {
    const given = revisionKey(rev);
    // A letter alone in its cell is easily recognised twice.
    return !isSameKey(given, key, isRecognised) && !(isRecognised && given === key + key);
  });
  if (other === undefined) return [meets({ ...asked, stated: first }, 'It is the revision ordered.')];
  return [
    wrong(
      'revision_mismatch',
      { ...asked, stated: other },
      `${ordered.part_number} was ordered at revision ${ordered.rev}, the certificate says ${other}.`,
    ),
  ];
}

const lotKeys = (written: string): string[] =>
  written
    .split(/[,;&/+\s]+/)
    .concat(written)
    .map((one) => plainKey(one.replace(/^[\s#]*(?:lot|heat)?\s*(?:no\.?|number)?[\s:#.]*/i, '')))
    .filter((key) => key !== '');

function lotOutcome(ordered: OrderLine, stated: readonly StatedLine[], isRecognised: boolean) {
  if (!ordered.lot) return [];
  const asked = { requirement: `lot ${ordered.lot}`, line: ordered.line, ordered: ordered.lot };
  const written = stated.flatMap(({ line }) => line.lot ?? []);
  const [first] = written;
  if (first === undefined) return [notStated(asked)];
  const own = lotKeys(ordered.lot);
  const isOwn = (lot: string) =>
    lotKeys(lot).some((key) => own.some((one) => isSameKey(one, key, isRecognised)));
  const other = written.find((lot) => !isOwn(lot));
  if (other === undefined) return [meets({ ...asked, stated: first }, 'It is the lot that was sent.')];
  return [
    wrong(
      'lot_mismatch',
      { ...asked, stated: other },
      `Lot ${ordered.lot} of ${ordered.part_number} was sent, the certificate says ${other}.`,
    ),
  ];
}

function serialOutcome(ordered: OrderLine, stated: readonly StatedLine[]): Outcome[] {
  const sent = ordered.serials ?? [];
  if (sent.length === 0) return [];
  const asked = {
    requirement: `serial numbers ${sent.join(', ')}`,
    line: ordered.line,
    ordered: sent.join(', '),
  };
  const written = stated.flatMap(({ line }) => line.serials ?? []);
  if (written.length === 0) return [notStated(asked)];
  const strange = written.filter((serial) => !sent.some((one) => likeness(one, serial) === 'same'));
  if (strange.length === 0)
    return [meets({ ...asked, stated: written.join(', ') }, 'All of them were sent.')];
  return [
    wrong(
      'serial_mismatch',
      { ...asked, stated: written.join(', ') },
      `Serial number ${strange.join(', ')} of ${ordered.part_number} was not sent.`,
    ),
  ];
}
