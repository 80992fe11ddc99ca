import type { Source } from '../source';
import type { Table } from '../table';
import { FROM_350_TO_400_F, type EmbrittlementRow } from './embrittlement-row';

const SECONDARY = 'on a secondary page';
const QQ_P_416: Source = { document: 'QQ-P-416E/F', confidence: 'memory', certainty: 'medium' };
const QQ_P_416F: Source = {
  document: 'QQ-P-416F (1 Oct 1991) 3.2',
  confidence: 'memory',
  certainty: 'medium',
};
const CADMIUM_416F = { specifications: ['QQ-P-416'], revisions: { letters: ['F'] } } as const;
const CADMIUM_AMS = { specifications: ['AMS-QQ-P-416'], revisions: 'any' } as const;

/** QQ-P-416F was carried on as AMS-QQ-P-416 with the same clauses. */
const ofCadmium = (
  rule: Omit<Table<EmbrittlementRow>['rows'][number], 'specifications' | 'revisions'>,
): Table<EmbrittlementRow>['rows'] => [
  { ...rule, ...CADMIUM_416F },
  { ...rule, ...CADMIUM_AMS },
];

/** Cadmium plating. */
export const CADMIUM_EMBRITTLEMENT: Table<EmbrittlementRow>['rows'] = [
  ...ofCadmium({
    treatment: 'not_to_be_plated',
    from: { ksi: 200, hrc: 43, isOver: true },
    source: { document: `QQ-P-416F 3.2.1, ${SECONDARY}`, confidence: 'read', certainty: 'high' },
  }),
  ...ofCadmium({
    treatment: 'special_cleaning',
    kinds: ['threaded_fastener'],
    from: { ksi: 160, hrc: 36 },
    source: { document: `QQ-P-416F 3.2.3, ${SECONDARY}`, confidence: 'read', certainty: 'high' },
  }),
  ...ofCadmium({
    treatment: 'embrittlement_relief',
    from: { hrc: 40 },
    temperature: FROM_350_TO_400_F,
    hours: [23, 23],
    startWithinHours: 4,
    source: QQ_P_416F,
  }),
  ...ofCadmium({
    treatment: 'stress_relief',
    onlyWorked: true,
    from: { hrc: 40 },
    temperature: FROM_350_TO_400_F,
    hours: [3, 3],
    source: QQ_P_416F,
  }),
  {
    specifications: ['QQ-P-416'],
    revisions: { letters: ['E'] },
    treatment: 'embrittlement_relief',
    from: { hrc: 40 },
    temperature: FROM_350_TO_400_F,
    hours: [3, 3],
    startWithinHours: 4,
    source: QQ_P_416,
  },
  {
    specifications: ['MIL-STD-870'],
    revisions: { letters: ['B'] },
    treatment: 'embrittlement_relief',
    from: { ksi: 180 },
    temperature: FROM_350_TO_400_F,
    hours: [23, 23],
    startWithinHours: 4,
    source: { document: 'MIL-STD-870B', confidence: 'memory', certainty: 'medium' },
  },
];
