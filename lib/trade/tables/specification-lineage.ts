import type { LineageEvent } from '../lineage/lineage-event';
import type { Table } from '../table';

import { COATING_LINEAGE } from './lineage-coatings';
import { HEAT_TREAT_LINEAGE } from './lineage-heat-treat';
import { INSPECTION_LINEAGE } from './lineage-inspection';
import { PLATING_LINEAGE } from './lineage-plating';
import { SHEET_LINEAGE } from './lineage-sheet';
import { TUBE_AND_BAR_LINEAGE } from './lineage-tube-and-bar';

/** What is known of specifications, as dated events. A specification that is not in it may well be current. */
export const SPECIFICATION_LINEAGE: Table<LineageEvent> = {
  id: 'specification-lineage',
  title: 'Specification lineage',
  edition: 'Collected from covers, notices and catalogues, 2026',
  rows: [
    ...HEAT_TREAT_LINEAGE,
    ...COATING_LINEAGE,
    ...PLATING_LINEAGE,
    ...INSPECTION_LINEAGE,
    ...SHEET_LINEAGE,
    ...TUBE_AND_BAR_LINEAGE,
  ],
};
