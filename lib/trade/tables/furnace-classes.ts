import type { FurnaceClassRow } from '../pyrometry/furnace-class';
import type { Source } from '../source';
import type { Table } from '../table';

const TABLE_11: Source = {
  document: 'AMS 2750F Table 11',
  confidence: 'read',
  certainty: 'high',
  address: 'http://www.hujibjl.com/oven_Article_11858446.html',
};

/** Some design authorities ask ±5 °C of class 2 and ±7 °C of class 3: their own edition says so. */
export const FURNACE_UNIFORMITY: Table<FurnaceClassRow> = {
  id: 'furnace-classes',
  title: 'Furnace classes and uniformity',
  edition: 'AMS 2750F (2020-06) Table 11',
  rows: [
    { class: 1, toleranceF: 5, toleranceC: 3, source: TABLE_11 },
    { class: 2, toleranceF: 10, toleranceC: 6, source: TABLE_11 },
    { class: 3, toleranceF: 15, toleranceC: 8, source: TABLE_11 },
    { class: 4, toleranceF: 20, toleranceC: 10, source: TABLE_11 },
    { class: 5, toleranceF: 25, toleranceC: 14, source: TABLE_11 },
    { class: 6, toleranceF: 50, toleranceC: 28, source: TABLE_11 },
  ],
};
