import { unplacedWords } from '@/lib/reference/load-words';

import type { NotPlanned } from './loads-of-batch';

const ABOUT_THE_PART = {
  material_not_known: 'no table here knows its alloy',
  not_wrought_aluminium: 'loads are planned for wrought aluminium only',
  form_not_stated: 'its part says no product form',
  condition_not_known: 'no table here knows its condition',
  thickness_not_stated: 'its part says no thickness',
};

/** Why no load is planned for a line; it goes after its number. */
export const notPlannedWords = (reason: NotPlanned): string =>
  isAboutThePart(reason) ? ABOUT_THE_PART[reason] : unplacedWords(reason);

const isAboutThePart = (reason: NotPlanned): reason is keyof typeof ABOUT_THE_PART =>
  reason in ABOUT_THE_PART;
