import type { DateOrder } from './corrections';
import type { TimeShape } from './time-shape';

/** A way of writing times in the usual letters: `DD.MM.YYYY HH:mm:ss`, `M/D/YYYY h:mm:ss A`. */
export function timeWords({ template, halfDays, date }: TimeShape, order: DateOrder): string {
  const parts = date === null ? [] : letters(date, order);
  return wordsAsLetters(template)
    .replace(/<(\d)(\d)>/g, (_, slot: string, length: string) => sized(parts[Number(slot)] ?? '', length))
    .replace(/<h(\d)>/g, (_, length: string) => sized(halfDays ? 'h' : 'H', length))
    .replace(/<([msd])(\d)>/g, (_, letter: string, length: string) => sized(letter, length))
    .replace(/<f(\d)>/g, (_, length: string) => 'S'.repeat(Number(length)));
}

const sized = (letter: string, length: string): string => letter.repeat(Math.min(4, Number(length)));

function letters(date: NonNullable<TimeShape['date']>, order: DateOrder): readonly string[] {
  if (date === 'year_last') return order === 'DMY' ? ['Y', 'D', 'M'] : ['Y', 'M', 'D'];
  return date === 'short' ? [...order] : ['Y', 'M', 'D'];
}

/** A word in a time is half of a day, a weekday or a month. */
const wordsAsLetters = (template: string): string =>
  template.replace(/(?<![a-z])[ap]\.?\s?m\.?(?![a-z])/i, 'A').replace(/\p{L}{3,}\.?/gu, wordLetters);

function wordLetters(word: string): string {
  // Compact times come as letters already.
  if (/^(?:YYYYMMDD|HHmmss)$/.test(word)) return word;
  if (/^(?:mon|tue|wed|thu|fri|sat|sun)/i.test(word)) return 'ddd';
  return word.length > 4 ? 'MMMM' : 'MMM';
}
