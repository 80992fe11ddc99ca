import type { Certainty, Source } from '../source';
import type { Table } from '../table';
import type { Temper } from '../tempers/temper';

/**
 * Who can make a temper. `mill_then_age`: the cold work is the mill's, the ageing after it may be done outside.
 * `mill_by_name`: a user can reach the same state, and it has another name then.
 */
export type MadeBy = 'mill' | 'mill_by_name' | 'mill_then_age' | 'user' | 'either';

/** Cold work between quench and ageing, or after natural ageing; percent as printed. */
export interface ColdWork {
  readonly kind: 'mill' | 'reduction' | 'stretch';
  readonly percent?: readonly [number, number];
  readonly percentByForm?: Readonly<Record<string, readonly [number, number]>>;
}

export interface TemperRow {
  readonly temper: Temper;
  readonly alsoWritten?: readonly string[];
  readonly madeBy: MadeBy;
  readonly coldWork?: ColdWork;
  /** What it is called when a user made it. */
  readonly madeByUserIs?: Temper;
  /** The state that results when the cold work is left out. */
  readonly withoutColdWork?: Temper;
  /** Means little without the time since the quench. */
  readonly statesTime?: true;
}

const H35_1 = 'ANSI H35.1/H35.1(M) Alloy and Temper Designation Systems for Aluminum';
const TO_1_1A_9 = 'T.O. 1-1A-9 para 3-54';
const READ: Source = { document: H35_1, confidence: 'read', certainty: 'high' };
const BRIGHTSUN: Source = {
  ...READ,
  address: 'http://www.brightsun-alu.com/en/showtechdata/Temper-Description-3.html',
};
const ALUMECO: Source = {
  ...READ,
  address: 'https://www.alumeco.com/knowledge-technique/aluminium-data/temper-descriptions',
};
const ALULAND: Source = { ...READ, address: 'https://www.aluland.com/hardness-coding' };
const MANUAL: Source = {
  ...READ,
  address: 'https://ja.scribd.com/document/377589586/Aluminum-Manual-15',
};
const H2ABC: Source = {
  ...READ,
  address: 'https://www.h2abc.com/material/detail.php?mid=azhlNWIxMzY1NTk%3D',
};
const FLIGHT_MECHANIC: Source = {
  ...READ,
  address: 'http://www.flight-mechanic.com/heat-treatment-of-nonferrous-metals/',
};
const STATED_TIME: Source = {
  document: `${H35_1}; FAA-H-8083-30 ch. heat treatment of nonferrous metals`,
  confidence: 'read',
  certainty: 'high',
  address: 'http://avstop.com/ac/apgeneral/heattreatmentofnonferrousmetals.html',
};
const FORMERLY_T736: Source = {
  document: H35_1,
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://123docz.net/document/2147497-handbook-of-materials-for-product-design-part-3-potx.htm',
};
const TO_ADDRESS = 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_166.htm';
const TO: Source = { document: TO_1_1A_9, confidence: 'read', certainty: 'high', address: TO_ADDRESS };
const TO_T86: Source = {
  document: `${TO_1_1A_9} (names T86 as needing controlled cold work; the 6 % figure is from memory)`,
  confidence: 'read+memory',
  certainty: 'high',
  address: TO_ADDRESS,
};
const memory = (document: string, certainty: Certainty): Source => ({
  document,
  confidence: 'memory',
  certainty,
});
const HIGH = memory(H35_1, 'high');
const MEDIUM = memory(H35_1, 'medium');

/** Temper designations: who makes them, and what cold work they need. */
export const TEMPER_DESIGNATIONS: Table<TemperRow> = {
  id: 'temper-designations',
  title: 'Temper designations of aluminium',
  edition: H35_1,
  rows: [
    { temper: 'F', madeBy: 'mill', source: BRIGHTSUN },
    { temper: 'O', alsoWritten: ['0', 'SO'], madeBy: 'either', source: ALUMECO },
    { temper: 'O1', madeBy: 'either', source: ALULAND },
    { temper: 'W', madeBy: 'user', statesTime: true, source: STATED_TIME },
    { temper: 'AQ', madeBy: 'user', source: memory('AMS 2770 usage', 'high') },
    { temper: 'T3', madeBy: 'mill', withoutColdWork: 'T42', coldWork: { kind: 'mill' }, source: MANUAL },
    {
      temper: 'T351',
      madeBy: 'mill',
      withoutColdWork: 'T42',
      coldWork: {
        kind: 'stretch',
        percentByForm: { sheet: [0.5, 3], plate: [1.5, 3], bar: [1, 3], forging: [1, 5] },
      },
      source: ALUMECO,
    },
    {
      temper: 'T361',
      alsoWritten: ['T36'],
      madeBy: 'mill',
      withoutColdWork: 'T42',
      coldWork: { kind: 'reduction', percent: [6, 6] },
      source: memory(`${H35_1}; ${TO_1_1A_9}`, 'high'),
    },
    {
      temper: 'T37',
      madeBy: 'mill',
      withoutColdWork: 'T42',
      coldWork: { kind: 'reduction', percent: [7, 8] },
      source: MEDIUM,
    },
    {
      temper: 'T31',
      madeBy: 'mill',
      withoutColdWork: 'T42',
      coldWork: { kind: 'reduction', percent: [1, 1] },
      source: MEDIUM,
    },
    { temper: 'T4', madeBy: 'mill_by_name', madeByUserIs: 'T42', source: MANUAL },
    { temper: 'T42', madeBy: 'user', source: H2ABC },
    {
      temper: 'T451',
      madeBy: 'mill',
      withoutColdWork: 'T42',
      coldWork: { kind: 'stretch' },
      source: ALUMECO,
    },
    { temper: 'T6', madeBy: 'mill_by_name', madeByUserIs: 'T62', source: MANUAL },
    {
      temper: 'T61',
      madeBy: 'either',
      source: { ...H2ABC, document: `${H35_1} usage`, certainty: 'medium' },
    },
    { temper: 'T62', madeBy: 'user', source: H2ABC },
    {
      temper: 'T651',
      madeBy: 'mill',
      withoutColdWork: 'T62',
      coldWork: { kind: 'stretch', percentByForm: { plate: [1.5, 3] } },
      source: ALUMECO,
    },
    { temper: 'T7', madeBy: 'either', source: ALUMECO },
    { temper: 'T72', madeBy: 'user', source: MEDIUM },
    { temper: 'T73', madeBy: 'either', source: ALUMECO },
    { temper: 'T74', alsoWritten: ['T736'], madeBy: 'either', source: FORMERLY_T736 },
    { temper: 'T76', madeBy: 'either', source: HIGH },
    {
      temper: 'T8',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T62',
      coldWork: { kind: 'mill' },
      source: FLIGHT_MECHANIC,
    },
    {
      temper: 'T81',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T62',
      coldWork: { kind: 'reduction', percent: [1, 1] },
      source: TO,
    },
    {
      temper: 'T851',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T62',
      coldWork: { kind: 'stretch' },
      source: HIGH,
    },
    {
      temper: 'T861',
      alsoWritten: ['T86'],
      madeBy: 'mill_then_age',
      withoutColdWork: 'T62',
      coldWork: { kind: 'reduction', percent: [6, 6] },
      source: TO_T86,
    },
    {
      temper: 'T87',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T62',
      coldWork: { kind: 'reduction', percent: [7, 8] },
      source: HIGH,
    },
    { temper: 'W51', madeBy: 'mill', withoutColdWork: 'AQ', coldWork: { kind: 'stretch' }, source: HIGH },
    {
      temper: 'T7351',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T73',
      coldWork: { kind: 'stretch' },
      source: HIGH,
    },
    {
      temper: 'T7451',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T74',
      coldWork: { kind: 'stretch' },
      source: HIGH,
    },
    {
      temper: 'T7651',
      madeBy: 'mill_then_age',
      withoutColdWork: 'T76',
      coldWork: { kind: 'stretch' },
      source: HIGH,
    },
  ],
};
