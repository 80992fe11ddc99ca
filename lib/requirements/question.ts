import { sourceWords } from '@/lib/batches/source-words';
import type { ToProve } from '@/lib/parts/to-prove';
import type { Source } from '@/lib/trade/source';

const LONGEST = 200;
const DECIDES = '; the drawing decides';

/**
 * Something that papers have to show and no table here has a value of: the drawing has it, and the person who makes the
 * order looks there. What an order may choose from, or what holds otherwise, stands behind it.
 */
export const question = (characteristic: string, source: Source, choice = ''): ToProve[] => [
  {
    characteristic,
    limit: ['as the drawing says', choice].filter(Boolean).join(', '),
    unit: '',
    source: 'drawing',
    sourceText: `${sourceWords(source).slice(0, LONGEST - DECIDES.length)}${DECIDES}`,
  },
];
