import { approvalsColumn } from './approvals-column';
import { australianForm } from './australian-form';
import { carbonCopy } from './carbon-copy';
import { germanReport } from './german-report';
import { halfSheet } from './half-sheet';
import { labelsBelow } from './labels-below';
import type { Layout } from './layout';
import { nordicLetter } from './nordic-letter';
import { numberedReport } from './numbered-report';
import { parameterMatrix } from './parameter-matrix';
import { replacedCertificate } from './replaced-certificate';
import { systemMail } from './system-mail';

/** Drawn after the third set, likewise without sight of the rules. */
export const FOURTH_HELD_OUT_LAYOUTS: readonly Layout[] = [
  replacedCertificate,
  germanReport,
  nordicLetter,
  australianForm,
  carbonCopy,
  parameterMatrix,
  systemMail,
  approvalsColumn,
  halfSheet,
  numberedReport,
  labelsBelow,
];
