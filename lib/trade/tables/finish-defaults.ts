import type { Designation } from '../finishes/read-designation';
import type { Source } from '../source';
import type { Table } from '../table';

/** What a document means where the order leaves something out. */
export type FinishDefaultRow = { readonly specifications: readonly string[] } & (
  | { readonly rule: 'when_unstated'; readonly means: Designation }
  /** Only engineering may allow citric acid instead; the acceptance test is of this class. */
  | {
      readonly rule: 'passivation_acid';
      readonly acid: 'nitric';
      readonly method: '1';
      readonly testClass: '4';
    }
);

const ACIDS: Source = {
  document: 'Standards notices on QQ-P-35 and AMS-QQ-P-35; AMS 2700E/F, classification',
  confidence: 'read',
  certainty: 'high',
  address: 'https://standardsforum.com/tag/ams-qq-p-35/',
};

export const FINISH_DEFAULTS: Table<FinishDefaultRow> = {
  id: 'finish-defaults',
  title: 'What holds where the order does not say',
  edition: 'MIL-DTL-5541F and AMS 2700',
  rows: [
    {
      specifications: ['MIL-DTL-5541', 'MIL-C-5541'],
      rule: 'when_unstated',
      means: { type: 'I' },
      source: {
        document: 'MIL-DTL-5541F, classification, as in a processor’s notes',
        confidence: 'read',
        certainty: 'high',
        address: 'https://aotco.com/mil-dtl-5541f-technical-notes',
      },
    },
    {
      specifications: ['QQ-P-35', 'AMS-QQ-P-35'],
      rule: 'passivation_acid',
      acid: 'nitric',
      method: '1',
      testClass: '4',
      source: ACIDS,
    },
  ],
};
