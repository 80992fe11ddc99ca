import type { OrderingRow } from '../ordering/ordering-checklist';
import type { Table } from '../table';

import { FINISH_ORDERING } from './ordering-finishes';
import { HEAT_TREAT_ORDERING } from './ordering-heat-treat';
import { INSPECTION_ORDERING } from './ordering-inspection';

/** What the purchaser is to state, by specification; the checklist that a contract review goes by. */
export const ORDERING_INFORMATION: Table<OrderingRow> = {
  id: 'ordering-information',
  title: 'Ordering information',
  edition: 'Collected from specifications and notices, 2026',
  rows: [...HEAT_TREAT_ORDERING, ...FINISH_ORDERING, ...INSPECTION_ORDERING],
};
