import type { Source } from '../source';
import type { Table } from '../table';
import { FROM_350_TO_400_F, type EmbrittlementRow } from './embrittlement-row';

const QQ_C_320: Source = { document: 'QQ-C-320B / AMS-QQ-C-320', confidence: 'memory', certainty: 'medium' };

/** Chromium plating and phosphate. */
export const CHROMIUM_EMBRITTLEMENT: Table<EmbrittlementRow>['rows'] = [
  {
    specifications: ['QQ-C-320'],
    revisions: { letters: ['B'] },
    treatment: 'embrittlement_relief',
    from: { hrc: 40 },
    temperature: FROM_350_TO_400_F,
    hours: [3, 3],
    startWithinHours: 4,
    source: QQ_C_320,
  },
  {
    specifications: ['AMS-QQ-C-320'],
    revisions: 'any',
    treatment: 'embrittlement_relief',
    from: { hrc: 40 },
    temperature: FROM_350_TO_400_F,
    hours: [23, 23],
    startWithinHours: 4,
    source: QQ_C_320,
  },
  {
    specifications: ['Thin dense chromium'],
    revisions: 'any',
    treatment: 'embrittlement_relief',
    from: { ksi: 220 },
    temperature: { unit: 'F', range: [375, 375] },
    hours: [12, 12],
    source: {
      document: 'Questions and answers of platers, hard and thin dense chromium',
      confidence: 'read',
      certainty: 'medium',
      address: 'http://www.nmfrc.org/crarchive/apr08a.cfm',
    },
  },
  {
    specifications: ['DOD-P-16232', 'MIL-DTL-16232'],
    revisions: 'any',
    treatment: 'embrittlement_relief',
    from: { hrc: 39, isOver: true },
    temperature: { unit: 'F', range: [210, 225] },
    hours: [8, 8],
    orRoomTemperatureHours: 120,
    source: { document: 'DOD-P-16232F / MIL-DTL-16232', confidence: 'memory', certainty: 'medium' },
  },
];
