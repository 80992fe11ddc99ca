import type { SingleSamplingRow } from '../sampling/single-sampling-plan';
import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED: Source = {
  document: 'MIL-STD-105E (10 May 1989) Table II-C',
  confidence: 'memory',
  certainty: 'medium',
};

/** Recalled, not seen: a shop compares it with its own copy before it relies on it. Between accept and reject the lot is taken and normal inspection comes back. */
export const SINGLE_SAMPLING_REDUCED: Table<SingleSamplingRow> = {
  id: 'single-sampling-reduced',
  title: 'Single sampling, reduced inspection',
  edition: 'MIL-STD-105E (10 May 1989) Table II-C',
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
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: 'down', 6.5: [0, 1] },
      source: RECALLED,
    },
    {
      letter: 'B',
      sampleSize: 2,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'B',
      sampleSize: 2,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: 'down', 4: [0, 1], 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'C',
      sampleSize: 2,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'C',
      sampleSize: 2,
      cells: { 0.65: 'down', 1: 'down', 1.5: 'down', 2.5: [0, 1], 4: 'up', 6.5: 'down' },
      source: RECALLED,
    },
    {
      letter: 'D',
      sampleSize: 3,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'D',
      sampleSize: 3,
      cells: { 0.65: 'down', 1: 'down', 1.5: [0, 1], 2.5: 'up', 4: 'down', 6.5: [0, 2] },
      source: RECALLED,
    },
    {
      letter: 'E',
      sampleSize: 5,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'E',
      sampleSize: 5,
      cells: { 0.65: 'down', 1: [0, 1], 1.5: 'up', 2.5: 'down', 4: [0, 2], 6.5: [1, 3] },
      source: RECALLED,
    },
    {
      letter: 'F',
      sampleSize: 8,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'F',
      sampleSize: 8,
      cells: { 0.65: [0, 1], 1: 'up', 1.5: 'down', 2.5: [0, 2], 4: [1, 3], 6.5: [1, 4] },
      source: RECALLED,
    },
    {
      letter: 'G',
      sampleSize: 13,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: 'down', 0.4: [0, 1] },
      source: RECALLED,
    },
    {
      letter: 'G',
      sampleSize: 13,
      cells: { 0.65: 'up', 1: 'down', 1.5: [0, 2], 2.5: [1, 3], 4: [1, 4], 6.5: [2, 5] },
      source: RECALLED,
    },
    {
      letter: 'H',
      sampleSize: 20,
      cells: { 0.1: 'down', 0.15: 'down', 0.25: [0, 1], 0.4: 'up' },
      source: RECALLED,
    },
    {
      letter: 'H',
      sampleSize: 20,
      cells: { 0.65: 'down', 1: [0, 2], 1.5: [1, 3], 2.5: [1, 4], 4: [2, 5], 6.5: [3, 6] },
      source: RECALLED,
    },
    {
      letter: 'J',
      sampleSize: 32,
      cells: { 0.1: 'down', 0.15: [0, 1], 0.25: 'up', 0.4: 'down' },
      source: RECALLED,
    },
    {
      letter: 'J',
      sampleSize: 32,
      cells: { 0.65: [0, 2], 1: [1, 3], 1.5: [1, 4], 2.5: [2, 5], 4: [3, 6], 6.5: [5, 8] },
      source: RECALLED,
    },
    {
      letter: 'K',
      sampleSize: 50,
      cells: { 0.1: [0, 1], 0.15: 'up', 0.25: 'down', 0.4: [0, 2] },
      source: RECALLED,
    },
    {
      letter: 'K',
      sampleSize: 50,
      cells: { 0.65: [1, 3], 1: [1, 4], 1.5: [2, 5], 2.5: [3, 6], 4: [5, 8], 6.5: [7, 10] },
      source: RECALLED,
    },
    {
      letter: 'L',
      sampleSize: 80,
      cells: { 0.1: 'up', 0.15: 'down', 0.25: [0, 2], 0.4: [1, 3] },
      source: RECALLED,
    },
    {
      letter: 'L',
      sampleSize: 80,
      cells: { 0.65: [1, 4], 1: [2, 5], 1.5: [3, 6], 2.5: [5, 8], 4: [7, 10], 6.5: [10, 13] },
      source: RECALLED,
    },
    {
      letter: 'M',
      sampleSize: 125,
      cells: { 0.1: 'down', 0.15: [0, 2], 0.25: [1, 3], 0.4: [1, 4] },
      source: RECALLED,
    },
    {
      letter: 'M',
      sampleSize: 125,
      cells: { 0.65: [2, 5], 1: [3, 6], 1.5: [5, 8], 2.5: [7, 10], 4: [10, 13], 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'N',
      sampleSize: 200,
      cells: { 0.1: [0, 2], 0.15: [1, 3], 0.25: [1, 4], 0.4: [2, 5] },
      source: RECALLED,
    },
    {
      letter: 'N',
      sampleSize: 200,
      cells: { 0.65: [3, 6], 1: [5, 8], 1.5: [7, 10], 2.5: [10, 13], 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'P',
      sampleSize: 315,
      cells: { 0.1: [1, 3], 0.15: [1, 4], 0.25: [2, 5], 0.4: [3, 6] },
      source: RECALLED,
    },
    {
      letter: 'P',
      sampleSize: 315,
      cells: { 0.65: [5, 8], 1: [7, 10], 1.5: [10, 13], 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'Q',
      sampleSize: 500,
      cells: { 0.1: [1, 4], 0.15: [2, 5], 0.25: [3, 6], 0.4: [5, 8] },
      source: RECALLED,
    },
    {
      letter: 'Q',
      sampleSize: 500,
      cells: { 0.65: [7, 10], 1: [10, 13], 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
    {
      letter: 'R',
      sampleSize: 800,
      cells: { 0.1: [2, 5], 0.15: [3, 6], 0.25: [5, 8], 0.4: [7, 10] },
      source: RECALLED,
    },
    {
      letter: 'R',
      sampleSize: 800,
      cells: { 0.65: [10, 13], 1: 'up', 1.5: 'up', 2.5: 'up', 4: 'up', 6.5: 'up' },
      source: RECALLED,
    },
  ],
};
