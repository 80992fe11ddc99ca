import type { TableReference } from './table';

/** How a value was obtained: seen in a stored text, partly so, worked out from the published rule, or recalled. */
export const CONFIDENCES = ['read', 'read+memory', 'computed', 'memory'] as const;
export type Confidence = (typeof CONFIDENCES)[number];

/** A judgement of how likely the value is to be right; what is not high is a default that a shop confirms. */
export const CERTAINTIES = ['high', 'medium', 'low'] as const;
export type Certainty = (typeof CERTAINTIES)[number];

/** Where a value comes from. Travels with the value to every screen and document that shows it. */
export interface Source {
  /** The document with its revision and clause, as a person would look it up. */
  readonly document: string;
  readonly confidence: Confidence;
  readonly certainty: Certainty;
  /** Where the text was read, when it was. */
  readonly address?: string;
  /** Who entered it from the shop's own copy of the document; a published row has none. */
  readonly enteredBy?: string;
  /** The table it stands in, where the tables in use were put together. */
  readonly readFrom?: TableReference;
}

/** A fact that everybody in the trade knows and no document was found for. */
export const COMMON_PRACTICE: Source = {
  document: 'Common practice, no source',
  confidence: 'memory',
  certainty: 'medium',
};
