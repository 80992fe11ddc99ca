import type { Discrepancy, RequirementVerdict, SeenCertificate, StatedCertificate } from '../certificate';
import type { Order } from '../../order';
import type { OpenedFile } from '../../page';
import { matchOrder } from '../match/match-order';
import { namesOrder } from '../match/same-order-number';
import { isBaked } from './bake-checks';
import { isOrderedClass, isQualifiedInspector } from './class-checks';
import type { Check, Compared } from './compared';
import { holdsFurnaceSteps, isAged } from './cycle-checks';
import { isHardEnough, readsAsItsCondition } from './hardness-checks';
import { hasRevisionLotAndSerials, showsEachPart } from './line-checks';
import { isOrderedAlloy, isOrderedCondition } from './material-checks';
import { comesFromProcessor, knowsWhatIsAsked, namesItsOrder } from './order-checks';
import type { Outcome } from './outcome';
import { pairLines } from './pair-lines';
import { hidesNothing, isDatedRight, isNew, isSigned, wasApproved, type Alone } from './paper-checks';
import { accountsForAllPieces, addsUp } from './quantity-checks';
import { isQuenched } from './quench-checks';
import { conducts, isStrongEnough, isThickEnough } from './reading-checks';
import { followsSpecification, isOrderedProcess } from './specification-checks';
import { PUBLISHED, type ComparisonTables } from './tables';

export interface Comparison {
  readonly verdicts: RequirementVerdict[];
  readonly discrepancies: Discrepancy[];
  readonly observations: string[];
  /** The batch of the open order that it belongs to, null where that is not clear. */
  readonly matches_batch: string | null;
}

export interface ComparisonInput {
  readonly stated: StatedCertificate;
  readonly file: Pick<OpenedFile, 'sha256' | 'recognised' | 'pages'>;
  /** The order that it is compared with; null: the one among `orders` that it clearly belongs to. */
  readonly order: Order | null;
  /** All open orders. */
  readonly orders?: readonly Order[];
  /** Other certificates of the same file: they may hold the rest of a line. */
  readonly others?: readonly StatedCertificate[];
  /** Received earlier; with `lines` as a read certificate has them, their pieces count too. */
  readonly seen?: readonly SeenCertificate[];
  /** `YYYY-MM-DD` */
  readonly today: string;
  /** The published ones where nothing is said. */
  readonly tables?: ComparisonTables;
}

/** Asked of every certificate, whatever was ordered. */
const ALONE: readonly ((alone: Alone) => readonly Outcome[])[] = [
  isSigned,
  isDatedRight,
  wasApproved,
  ({ stated }) => addsUp(stated),
  hidesNothing,
];

/** Asked where the certificate speaks of this order, in the order of the verdicts. */
const BESIDE_ORDER: readonly Check[] = [
  comesFromProcessor,
  showsEachPart,
  hasRevisionLotAndSerials,
  accountsForAllPieces,
  followsSpecification,
  isOrderedProcess,
  isOrderedClass,
  isQualifiedInspector,
  isOrderedAlloy,
  isOrderedCondition,
  holdsFurnaceSteps,
  isQuenched,
  isAged,
  isHardEnough,
  conducts,
  readsAsItsCondition,
  isStrongEnough,
  isThickEnough,
  isBaked,
  knowsWhatIsAsked,
];

/**
 * Compares what a certificate states with what was ordered: per line and requirement whether it is met, and everything
 * that a good inspector would stop at, once for each cause. It proposes; a person decides.
 *
 * @returns only what is asked of every certificate where `order` is null and no open order clearly fits.
 */
export function compare({
  stated,
  file,
  order: given,
  orders = [],
  others = [],
  seen = [],
  today,
  tables = PUBLISHED,
}: ComparisonInput): Comparison {
  const open = given === null ? orders : [given, ...orders.filter(({ batch }) => batch !== given.batch)];
  const match = matchOrder(stated, open, { isRecognised: file.recognised });
  const order = given ?? match.matched;
  const compared =
    order &&
    comparedWith(order, {
      stated,
      orders,
      others,
      seen,
      pages: pagesOf(stated, file),
      isRecognised: file.recognised,
      tables,
    });
  // What follows from the order says nothing of a certificate that is for another one.
  const own = compared?.isOfOtherOrder ? null : order;
  const outcomes = [
    ...(compared ? compareWithOrder(compared) : []),
    ...ALONE.flatMap((check) => check({ stated, file, order: own, seen, today })),
    ...isNew({ stated, file, order, seen, today }),
  ];
  return {
    verdicts: outcomes.flatMap(verdictOf),
    discrepancies: outcomes.flatMap(discrepancyOf),
    observations: [
      ...(order ? [] : withoutOrder(match.candidates.map((one) => one.order))),
      ...outcomes.filter(({ isObservation }) => isObservation).map(({ why }) => why),
    ],
    matches_batch: match.matches_batch,
  };
}

function withoutOrder(candidates: readonly Order[]): string[] {
  const likely = candidates.map(({ po, batch }) => `${po} (batch ${batch})`).join(', ');
  return [
    `It belongs to no open order for certain, so it was compared with none.${likely ? ` It may be ${likely}.` : ''}`,
  ];
}

type Sides = Pick<Compared, 'stated' | 'orders' | 'others' | 'seen' | 'pages' | 'isRecognised' | 'tables'>;

/** Those that something of this certificate was read on; a file may hold several. */
function pagesOf({ facts }: StatedCertificate, { pages }: Pick<OpenedFile, 'pages'>): OpenedFile['pages'] {
  const own = new Set(facts.map(({ page }) => page));
  return own.size === 0 ? pages : pages.filter(({ number }) => own.has(number));
}

function comparedWith(order: Order, sides: Sides): Compared {
  const { stated, others, isRecognised } = sides;
  const pairs = pairLines(order, stated.lines);
  const isNamed = stated.purchase_order === null || namesOrder(stated.purchase_order, order.po, isRecognised);
  const hasAny = pairs.pairs.some((pair) => pair.stated.some(({ by }) => by !== 'only_one_left'));
  const ofOrder = others.filter(
    ({ purchase_order }) => purchase_order === null || namesOrder(purchase_order, order.po, isRecognised),
  );
  const isOfOtherOrder = !isNamed && !hasAny && stated.lines.length > 0;
  return { ...sides, order, pairs, others: ofOrder, isOfOtherOrder };
}

/** Of a certificate for another order only that is said: every further difference has the same cause. */
const compareWithOrder = (compared: Compared): Outcome[] => [
  ...namesItsOrder(compared),
  ...(compared.isOfOtherOrder ? [] : BESIDE_ORDER.flatMap((check) => check(compared))),
];

function verdictOf({ requirement, line, stated, verdict, why }: Outcome): RequirementVerdict[] {
  return requirement === null ? [] : [{ requirement, line, stated, verdict, why }];
}

function discrepancyOf({ wrong, line, ordered, stated, why }: Outcome): Discrepancy[] {
  return wrong ? [{ ...wrong, line, ordered, stated, message: why }] : [];
}
