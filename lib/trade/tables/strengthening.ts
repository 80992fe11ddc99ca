import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface StrengtheningRow {
  readonly alloys: readonly Alloy[];
  readonly fullStrengthBy: 'natural_ageing' | 'artificial_ageing';
}

const TO_1_1A_9: Source = {
  document: 'T.O. 1-1A-9 para 3-18',
  confidence: 'read',
  certainty: 'high',
  address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_161.htm',
};

/** Whether an alloy reaches its full strength by lying, or only in an oven. */
export const STRENGTHENING: Table<StrengtheningRow> = {
  id: 'strengthening',
  title: 'Ageing to full strength',
  edition: 'T.O. 1-1A-9',
  rows: [
    { alloys: ['2017', '2024'], fullStrengthBy: 'natural_ageing', source: TO_1_1A_9 },
    { alloys: ['2014', '7075', '7178'], fullStrengthBy: 'artificial_ageing', source: TO_1_1A_9 },
  ],
};
