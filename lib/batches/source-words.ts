import type { Source } from '@/lib/trade/source';

const HOW: Record<Source['confidence'], string> = {
  read: 'read',
  'read+memory': 'partly from memory',
  computed: 'worked out',
  memory: 'from memory',
};

/** Where a fact of the trade comes from and how sure it is: `AMS 2770 (from memory, low trust)`. */
export const sourceWords = ({ document, confidence, certainty }: Source): string =>
  `${document} (${HOW[confidence]}, ${certainty} trust)`;
