import type { SingleSamplingRow } from '../sampling/single-sampling-plan';
import type { Source } from '../source';
import type { Table } from '../table';

const READ: Source = {
  document: 'MIL-STD-105E Table II-B',
  confidence: 'read',
  certainty: 'high',
  address: 'http://www.nibs.org/FMOC/DPW_AC/AC-TABLE.ASC',
};

const RECALLED: Source = {
  document: 'MIL-STD-105E Table II-B',
  confidence: 'memory',
  certainty: 'high',
};

/** As printed: a plan is [accept, reject], an arrow points to the plan to be used instead. */
export const SINGLE_SAMPLING_TIGHTENED: Table<SingleSamplingRow> = {
  id: 'single-sampling-tightened',
  title: 'Single sampling, tightened inspection',
  edition: 'MIL-STD-105E (10 May 1989) Table II-B',
  rows: [
    {
      letter: 'A',
      sampleSize: 2,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'A',
      sampleSize: 2,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: 'down', 6.5: 'down' },
      source: READ,
    },
    {
      letter: 'B',
      sampleSize: 3,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'B',
      sampleSize: 3,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: 'down', 6.5: [0, 1] },
      source: READ,
    },
    {
      letter: 'C',
      sampleSize: 5,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'C',
      sampleSize: 5,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: [0, 1], 6.5: 'down' },
      source: READ,
    },
    {
      letter: 'D',
      sampleSize: 8,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'D',
      sampleSize: 8,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: [0, 1], 4: 'down', 6.5: 'down' },
      source: READ,
    },
    {
      letter: 'E',
      sampleSize: 13,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'E',
      sampleSize: 13,
      cells: { 0.65: 'down', 1: 'down', 1.5: [0, 1], 2.5: 'down', 4: 'down', 6.5: [1, 2] },
      source: READ,
    },
    {
      letter: 'F',
      sampleSize: 20,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'F',
      sampleSize: 20,
      cells: { 0.65: 'down', 1: [0, 1], 1.5: 'down', 2.5: 'down', 4: [1, 2], 6.5: [2, 3] },
      source: READ,
    },
    {
      letter: 'G',
      sampleSize: 32,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'G',
      sampleSize: 32,
      cells: { 0.65: [0, 1], 1: 'down', 1.5: 'down', 2.5: [1, 2], 4: [2, 3], 6.5: [3, 4] },
      source: READ,
    },
    {
      letter: 'H',
      sampleSize: 50,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: [0, 1] },
      source: RECALLED,
    },
    {
      letter: 'H',
      sampleSize: 50,
      cells: { 0.65: 'down', 1: 'down', 1.5: [1, 2], 2.5: [2, 3], 4: [3, 4], 6.5: [5, 6] },
      source: READ,
    },
    {
      letter: 'J',
      sampleSize: 80,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: [0, 1], 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'J',
      sampleSize: 80,
      cells: { 0.65: 'down', 1: [1, 2], 1.5: [2, 3], 2.5: [3, 4], 4: [5, 6], 6.5: [8, 9] },
      source: READ,
    },
    {
      letter: 'K',
      sampleSize: 125,
      cells: { 0.1: 'down', 0.15: [0, 1], 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'K',
      sampleSize: 125,
      cells: { 0.65: [1, 2], 1: [2, 3], 1.5: [3, 4], 2.5: [5, 6], 4: [8, 9], 6.5: [12, 13] },
      source: READ,
    },
    {
      letter: 'L',
      sampleSize: 200,
      cells: { 0.1: [0, 1], 0.15: 'down', 0.25: 'down', 0.4: [1, 2] },
      source: RECALLED,
    },
    {
      letter: 'L',
      sampleSize: 200,
      cells: { 0.65: [2, 3], 1: [3, 4], 1.5: [5, 6], 2.5: [8, 9], 4: [12, 13], 6.5: [18, 19] },
      source: RECALLED,
    },
    {
      letter: 'M',
      sampleSize: 315,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: [1, 2], 0.4: [2, 3] },
      source: RECALLED,
    },
    {
      letter: 'M',
      sampleSize: 315,
      cells: { 0.65: [3, 4], 1: [5, 6], 1.5: [8, 9], 2.5: [12, 13], 4: [18, 19], 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'N',
      sampleSize: 500,
      cells: { 0.1: 'down', 0.15: [1, 2], 0.25: [2, 3], 0.4: [3, 4] },
      source: RECALLED,
    },
    {
      letter: 'N',
      sampleSize: 500,
      cells: { 0.65: [5, 6], 1: [8, 9], 1.5: [12, 13], 2.5: [18, 19], 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'P',
      sampleSize: 800,
      cells: { 0.1: [1, 2], 0.15: [2, 3], 0.25: [3, 4], 0.4: [5, 6] },
      source: RECALLED,
    },
    {
      letter: 'P',
      sampleSize: 800,
      cells: { 0.65: [8, 9], 1: [12, 13], 1.5: [18, 19], 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'Q',
      sampleSize: 1250,
      cells: { 0.1: [2, 3], 0.15: [3, 4], 0.25: [5, 6], 0.4: [8, 9] },
      source: RECALLED,
    },
    {
      letter: 'Q',
      sampleSize: 1250,
      cells: { 0.65: [12, 13], 1: [18, 19], 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'R',
      sampleSize: 2000,
      cells: { 0.1: [3, 4], 0.15: [5, 6], 0.25: [8, 9], 0.4: [12, 13] },
      source: RECALLED,
    },
    {
      letter: 'R',
      sampleSize: 2000,
      cells: { 0.65: [18, 19], 1: 'up', 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
  ],
};
