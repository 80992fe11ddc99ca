import type { Source } from '@/lib/trade/source';
import type { TableReference } from '@/lib/trade/table';

const HOW: Record<Source['confidence'], string> = {
  read: 'read',
  'read+memory': 'partly from memory',
  computed: 'worked out',
  memory: 'from memory',
};

/**
 * Where a fact of the trade comes from and how sure it is: `AMS 2770 (from memory, low trust)`; of a shop's own edition
 * who entered it: `AMS 2770, revision R, Table 4 (entered by Rosa Lindqvist)`.
 */
export const sourceWords = ({ document, confidence, certainty, enteredBy }: Source): string =>
  enteredBy === undefined
    ? `${document} (${HOW[confidence]}, ${certainty} trust)`
    : `${document} (entered by ${enteredBy})`;

/** The sources of a finding in words, and the tables and editions that it was read from. */
export function citing(...sources: readonly Source[]): { source: string; readFrom?: TableReference[] } {
  const readFrom = sources.flatMap((source) => source.readFrom ?? []);
  return {
    source: [...new Set(sources.map(sourceWords))].join('; '),
    ...(readFrom.length > 0 && { readFrom }),
  };
}
