import { PLACE_WORDS } from '@/components/lots/place-words';
import type { DossierBatch } from '@/lib/dossiers/content';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';
import type { Place } from '@/lib/stock/places';

export const processWords = (process: string): string => PROCESS_WORDS[process as Process] ?? process;

/** `at processor, B-0404 line 1`; what waits says for which step. */
export function spotText(place: string, holder: string): string {
  const word = PLACE_WORDS[place as Place] ?? place.replaceAll('_', ' ');
  if (holder === '') return word;
  return place === 'making' ? `in the yard, ${holder}` : `${word}, ${holder}`;
}

/** The ledger names a spot as `at_processor B-0404 line 1`. */
export function movementSpot(text: string): string {
  const [place = '', ...holder] = text.split(' ');
  return spotText(place, holder.join(' '));
}

export const reasonWords = (reason: string): string => reason.replaceAll('_', ' ');

export function receiptWords(one: DossierBatch['receipts'][number]): string {
  const parts = [
    `${one.good} good`,
    one.damaged > 0 && `${one.damaged} damaged`,
    one.short > 0 && `${one.short} short`,
    one.over > 0 && `${one.over} over`,
  ];
  return parts.filter(Boolean).join(', ');
}

/** `O to T42` */
export const conditionsWords = ({
  conditionBefore,
  targetCondition,
}: Pick<DossierBatch, 'conditionBefore' | 'targetCondition'>): string =>
  [conditionBefore, targetCondition].filter(Boolean).join(' to ');

/** Papers are read years later, so a moment on them always names its year: seen from here no day is of this year. */
export const ALWAYS_WITH_YEAR = new Date(0);
