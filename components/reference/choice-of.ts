import type { SelectOption } from '@/components/ui/field';

/** What a field of choices says, as one of the words it may say; something else in the address counts as not said. */
export const choiceOf = <Word extends string>(words: readonly Word[], typed: string, otherwise: Word): Word =>
  words.find((word) => word === typed) ?? otherwise;

/** Words of the trade as the lines of a list, in their order. */
export const optionsOf = (words: Readonly<Record<string, string>>): SelectOption[] =>
  Object.entries(words).map(([value, says]) => ({ value, says }));

/** Names that say themselves. */
export const optionsSaying = (names: readonly string[]): SelectOption[] =>
  names.map((name) => ({ value: name, says: name }));
