import type { TableReference } from '@/lib/trade/table';

/** Whether it keeps the batch here, asks for a second look, or is only good to know. */
export const CHECK_LEVELS = ['stop', 'warn', 'note'] as const;
export type CheckLevel = (typeof CHECK_LEVELS)[number];

/** What the person can do about it, in place. */
export const WAYS_OUT = [
  'override',
  'take_out_line',
  'add_lot',
  'set_days',
  'set_prices',
  'set_requirements',
  'set_loads',
  'state_order',
  'choose_processor',
  'see_processor',
  'take_up',
] as const;
export interface WayOut {
  way: (typeof WAYS_OUT)[number];
  says: string;
  lineId?: string;
  partId?: string;
}

export interface Finding {
  code: string;
  level: CheckLevel;
  /** What exactly it is about: empty for the batch, else the id of the line or processor. With the code it names the finding. */
  subject: string;
  sentence: string;
  rest: string;
  source?: string;
  /** The tables and editions it was found by, where it was found by any. */
  readFrom?: TableReference[];
  waysOut: readonly WayOut[];
}

export const OVERRIDE: WayOut = { way: 'override', says: 'Override' };

/** An admin may let a blocker pass with a reason where the finding offers it. */
export const canOverride = (finding: Finding): boolean =>
  finding.level === 'stop' && finding.waysOut.some((one) => one.way === 'override');
