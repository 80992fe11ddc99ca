/** The beginnings of the months' names in the languages that recorders print. */
const MONTHS: readonly string[] = [
  'jan|ene|gen|janv',
  'feb|fév|fev|fe',
  'mar|mär|mrz|maa|mae|már',
  'apr|avr|abr',
  'mai|may|mei|maj|mag|maio',
  'jun|juin|giu',
  'jul|juil|lug',
  'aug|aoû|aou|ago',
  'sep|set',
  'okt|oct|out|ott',
  'nov',
  'dec|dez|déc|dic',
];

/** The month that a word names, 1 to 12, or 0. */
export function monthOf(word: string): number {
  const lower = word.toLowerCase();
  return MONTHS.findIndex((names) => names.split('|').some((name) => lower.startsWith(name))) + 1;
}
