import type { SingleSamplingRow } from '../sampling/single-sampling-plan';
import type { Source } from '../source';
import type { Table } from '../table';

const READ: Source = {
  document: 'MIL-STD-105E (10 May 1989) Table II-A',
  confidence: 'read',
  certainty: 'high',
  address: 'http://www.nibs.org/FMOC/DPW_AC/AC-TABLE.ASC',
};

/** Partly seen in a copy, completed from memory. */
const COPIED: Source = {
  document: 'MIL-STD-105E (10 May 1989) Table II-A',
  confidence: 'read+memory',
  certainty: 'high',
};

/** As printed: a plan is [accept, reject], an arrow points to the plan to be used instead. */
export const SINGLE_SAMPLING_NORMAL: Table<SingleSamplingRow> = {
  id: 'single-sampling-normal',
  title: 'Single sampling, normal inspection',
  edition: 'MIL-STD-105E (10 May 1989) Table II-A',
  rows: [
    {
      letter: 'A',
      sampleSize: 2,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'A',
      sampleSize: 2,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: 'down', 6.5: [0, 1] },
      source: READ,
    },
    {
      letter: 'B',
      sampleSize: 3,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'B',
      sampleSize: 3,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: [0, 1], 6.5: 'up' },
      source: READ,
    },
    {
      letter: 'C',
      sampleSize: 5,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'C',
      sampleSize: 5,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: [0, 1], 4: 'up', 6.5: 'down' },
      source: READ,
    },
    {
      letter: 'D',
      sampleSize: 8,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'D',
      sampleSize: 8,
      cells: { 0.65: 'down', 1: 'down', 1.5: [0, 1], 2.5: 'up', 4: 'down', 6.5: [1, 2] },
      source: READ,
    },
    {
      letter: 'E',
      sampleSize: 13,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'E',
      sampleSize: 13,
      cells: { 0.65: 'down', 1: [0, 1], 1.5: 'up', 2.5: 'down', 4: [1, 2], 6.5: [2, 3] },
      source: READ,
    },
    {
      letter: 'F',
      sampleSize: 20,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'F',
      sampleSize: 20,
      cells: { 0.65: [0, 1], 1: 'up', 1.5: 'down', 2.5: [1, 2], 4: [2, 3], 6.5: [3, 4] },
      source: READ,
    },
    {
      letter: 'G',
      sampleSize: 32,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: [0, 1] },
      source: COPIED,
    },
    {
      letter: 'G',
      sampleSize: 32,
      cells: { 0.65: 'up', 1: 'down', 1.5: [1, 2], 2.5: [2, 3], 4: [3, 4], 6.5: [5, 6] },
      source: READ,
    },
    {
      letter: 'H',
      sampleSize: 50,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: [0, 1], 0.4: 'up' },
      source: COPIED,
    },
    {
      letter: 'H',
      sampleSize: 50,
      cells: { 0.65: 'down', 1: [1, 2], 1.5: [2, 3], 2.5: [3, 4], 4: [5, 6], 6.5: [7, 8] },
      source: READ,
    },
    {
      letter: 'J',
      sampleSize: 80,
      cells: { 0.1: 'down', 0.15: [0, 1], 0.25: 'up', 0.4: 'down' },
      source: COPIED,
    },
    {
      letter: 'J',
      sampleSize: 80,
      cells: { 0.65: [1, 2], 1: [2, 3], 1.5: [3, 4], 2.5: [5, 6], 4: [7, 8], 6.5: [10, 11] },
      source: READ,
    },
    {
      letter: 'K',
      sampleSize: 125,
      cells: { 0.1: [0, 1], 0.15: 'up', 0.25: 'down', 0.4: [1, 2] },
      source: COPIED,
    },
    {
      letter: 'K',
      sampleSize: 125,
      cells: { 0.65: [2, 3], 1: [3, 4], 1.5: [5, 6], 2.5: [7, 8], 4: [10, 11], 6.5: [14, 15] },
      source: READ,
    },
    {
      letter: 'L',
      sampleSize: 200,
      cells: { 0.1: 'up', 0.15: 'down', 0.25: [1, 2], 0.4: [2, 3] },
      source: COPIED,
    },
    {
      letter: 'L',
      sampleSize: 200,
      cells: { 0.65: [3, 4], 1: [5, 6], 1.5: [7, 8], 2.5: [10, 11], 4: [14, 15], 6.5: [21, 22] },
      source: READ,
    },
    {
      letter: 'M',
      sampleSize: 315,
      cells: { 0.1: 'down', 0.15: [1, 2], 0.25: [2, 3], 0.4: [3, 4] },
      source: COPIED,
    },
    {
      letter: 'M',
      sampleSize: 315,
      cells: { 0.65: [5, 6], 1: [7, 8], 1.5: [10, 11], 2.5: [14, 15], 4: [21, 22], 6.5: 'up' },
      source: READ,
    },
    {
      letter: 'N',
      sampleSize: 500,
      cells: { 0.1: [1, 2], 0.15: [2, 3], 0.25: [3, 4], 0.4: [5, 6] },
      source: COPIED,
    },
    {
      letter: 'N',
      sampleSize: 500,
      cells: { 0.65: [7, 8], 1: [10, 11], 1.5: [14, 15], 2.5: [21, 22], 4: 'up', 6.5: 'up' },
      source: READ,
    },
    {
      letter: 'P',
      sampleSize: 800,
      cells: { 0.1: [2, 3], 0.15: [3, 4], 0.25: [5, 6], 0.4: [7, 8] },
      source: COPIED,
    },
    {
      letter: 'P',
      sampleSize: 800,
      cells: { 0.65: [10, 11], 1: [14, 15], 1.5: [21, 22], 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: READ,
    },
    {
      letter: 'Q',
      sampleSize: 1250,
      cells: { 0.1: [3, 4], 0.15: [5, 6], 0.25: [7, 8], 0.4: [10, 11] },
      source: COPIED,
    },
    {
      letter: 'Q',
      sampleSize: 1250,
      cells: { 0.65: [14, 15], 1: [21, 22], 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: READ,
    },
    {
      letter: 'R',
      sampleSize: 2000,
      cells: { 0.1: [5, 6], 0.15: [7, 8], 0.25: [10, 11], 0.4: [14, 15] },
      source: COPIED,
    },
    {
      letter: 'R',
      sampleSize: 2000,
      cells: { 0.65: [21, 22], 1: 'up', 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: COPIED,
    },
  ],
};
