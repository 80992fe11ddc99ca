import type { Table } from '../table';
import { CADMIUM_EMBRITTLEMENT } from './embrittlement-cadmium';
import { CHROMIUM_EMBRITTLEMENT } from './embrittlement-chromium';
import { PRACTICES_OF_EMBRITTLEMENT } from './embrittlement-practices';
import type { EmbrittlementRow } from './embrittlement-row';

/** There is no one threshold: rules go by document and revision. */
export const EMBRITTLEMENT_RULES: Table<EmbrittlementRow> = {
  id: 'embrittlement-rules',
  title: 'Hydrogen embrittlement and stress relief by specification and revision',
  edition: 'The documents named in each row',
  rows: [...CADMIUM_EMBRITTLEMENT, ...PRACTICES_OF_EMBRITTLEMENT, ...CHROMIUM_EMBRITTLEMENT],
};
