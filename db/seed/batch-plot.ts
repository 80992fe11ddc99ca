import type { ToProve } from '@/lib/parts/to-prove';

import type { DemoPerson, DemoProcessor } from './organisations';

export interface LineToSend {
  lotId: string;
  stepId: string;
  pieces: number;
  unitPriceMinor: number;
}

/** What happens to one batch, in days after it was begun. What is left out does not happen (yet). */
export interface BatchPlot {
  processor: DemoProcessor;
  lines: readonly LineToSend[];
  wholeBatch?: readonly ToProve[];
  lotMinimumMinor?: number;
  certificationFeeMinor?: number;
  begun: Date;
  leavesInDays: number;
  wantedInDays: number;
  dispatchedAfter?: number;
  acknowledgedAfter?: number;
  /** Days of begun that are promised, in turn. */
  promises?: readonly number[];
  question?: { after: number; body: string };
  /** Called back before anything of it came back. */
  cancelled?: { after: number; reason: string };
  shippedAfter?: number;
  receivedAfter?: number;
  /** Short of the last line in this delivery. */
  missing?: number;
  papersAfter?: number;
  /** Pieces of the last line that the certificate does not cover. */
  uncovered?: number;
  /** What the certificate states otherwise than it ought to, by characteristic. */
  states?: Readonly<Record<string, string>>;
  /** Minutes at temperature on the chart that comes with the certificate; without it no chart comes. */
  soakedMin?: number;
  provedAfter?: number;
  held?: { after: number; pieces: number; what: string };
  invoicedAfter?: number;
  /** What the invoice asks too much, on top of the order. */
  invoiceExtra?: { description: string; amountMinor: number };
  enteredAfter?: number;
  paidAfter?: number;
  releasedAfter?: number;
}

export interface Crew {
  lead: DemoPerson;
  inspector: DemoPerson;
  office: DemoPerson;
  shopId: string;
  locationId: string;
}
