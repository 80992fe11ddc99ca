import type { Order } from '../../order';
import type { Page } from '../../page';
import type { SeenCertificate, StatedCertificate } from '../certificate';
import type { Outcome } from './outcome';
import type { PairedLines } from './pair-lines';
import type { ComparisonTables } from './tables';

/** A certificate beside the order that it is compared with. */
export interface Compared {
  readonly stated: StatedCertificate;
  readonly order: Order;
  readonly orders: readonly Order[];
  /** Other certificates for the same order: they may hold the rest of a line. */
  readonly others: readonly StatedCertificate[];
  readonly seen: readonly SeenCertificate[];
  readonly isRecognised: boolean;
  /** Those in force where the order was made. */
  readonly tables: ComparisonTables;
  /** Of the file that the certificate stands on. */
  readonly pages: readonly Page[];
  readonly pairs: PairedLines;
  /** The order's number is another one, and no part number of this order stands on the certificate. */
  readonly isOfOtherOrder: boolean;
}

/** One family of questions to a certificate beside its order. */
export type Check = (compared: Compared) => readonly Outcome[];
