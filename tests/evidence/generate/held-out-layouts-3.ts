import { affidavit } from './affidavit';
import { britishCells } from './british-cells';
import { continued } from './continued';
import { dotMatrix } from './dot-matrix';
import type { Layout } from './layout';
import { mailReply } from './mail-reply';
import { operationsLog } from './operations-log';
import { tickedForm } from './ticked-form';

/** Drawn by one who had not seen the rules of reading. */
export const THIRD_HELD_OUT_LAYOUTS: readonly Layout[] = [
  operationsLog,
  mailReply,
  britishCells,
  dotMatrix,
  tickedForm,
  affidavit,
  continued,
];
