import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED: Source = { document: 'ASTM E18', confidence: 'memory', certainty: 'high' };

/** How much metal a hardness indentation needs around it. */
export interface HardnessTestRoomRow {
  readonly need: 'thickness' | 'from_edge' | 'between_indentations';
  /** What the need is counted in. */
  readonly of: 'depth' | 'diameter';
  readonly times: number;
}

export const HARDNESS_TEST_ROOM: Table<HardnessTestRoomRow> = {
  id: 'hardness-test-room',
  title: 'Room that a hardness indentation needs',
  edition: 'ASTM E18',
  rows: [
    { need: 'thickness', of: 'depth', times: 10, source: RECALLED },
    { need: 'from_edge', of: 'diameter', times: 2.5, source: RECALLED },
    { need: 'between_indentations', of: 'diameter', times: 3, source: RECALLED },
  ],
};
