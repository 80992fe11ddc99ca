import type { TestIntervalRow } from '../pyrometry/test-intervals';
import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED: Source = {
  document: 'AMS 2750E Tables 6 and 8, parts furnaces',
  confidence: 'memory',
  certainty: 'medium',
};
const RECALLED_WEAKLY: Source = { ...RECALLED, certainty: 'low' };
/** The surveys of class 2 type B and of class 5 type B were read as described by others; the rest is from memory. */
const DESCRIBED: Source = {
  document: 'AMS 2750E Tables 6 and 8, parts furnaces; survey chart as described',
  confidence: 'read+memory',
  certainty: 'high',
};
/** The accuracy test of class 3 type B was read as quoted; the rest is from memory. */
const QUOTED: Source = {
  document: 'AMS 2750E Table 6 as quoted, and Table 8, parts furnaces',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'http://www.eng-tips.com/viewthread.cfm?qid=423752',
};

/** Type D+ came with a later revision and has no row here. */
export const PYROMETRY_INTERVALS: Table<TestIntervalRow> = {
  id: 'pyrometry-intervals',
  title: 'Accuracy test and uniformity survey intervals, parts furnaces',
  edition: 'AMS 2750E (2012-07) Tables 6 and 8',
  rows: [
    {
      classes: [1],
      types: ['D'],
      accuracyTest: 'weekly',
      accuracyTestExtended: 'weekly',
      survey: 'monthly',
      surveyExtended: 'bimonthly',
      source: RECALLED,
    },
    {
      classes: [1],
      types: ['B', 'C'],
      accuracyTest: 'weekly',
      accuracyTestExtended: 'biweekly',
      survey: 'monthly',
      surveyExtended: 'quarterly',
      source: RECALLED,
    },
    {
      classes: [1],
      types: ['A'],
      accuracyTest: 'biweekly',
      accuracyTestExtended: 'monthly',
      survey: 'monthly',
      surveyExtended: 'semiannual',
      source: RECALLED_WEAKLY,
    },
    {
      classes: [2],
      types: ['D'],
      accuracyTest: 'weekly',
      accuracyTestExtended: 'biweekly',
      survey: 'monthly',
      surveyExtended: 'bimonthly',
      source: RECALLED,
    },
    {
      classes: [2],
      types: ['B', 'C'],
      accuracyTest: 'biweekly',
      accuracyTestExtended: 'monthly',
      survey: 'monthly',
      surveyExtended: 'quarterly',
      source: DESCRIBED,
    },
    {
      classes: [2],
      types: ['A'],
      accuracyTest: 'monthly',
      accuracyTestExtended: 'quarterly',
      survey: 'monthly',
      surveyExtended: 'semiannual',
      source: RECALLED_WEAKLY,
    },
    {
      classes: [3, 4],
      types: ['D'],
      accuracyTest: 'biweekly',
      accuracyTestExtended: 'monthly',
      survey: 'quarterly',
      surveyExtended: 'semiannual',
      source: RECALLED,
    },
    {
      classes: [3, 4],
      types: ['B', 'C'],
      accuracyTest: 'monthly',
      accuracyTestExtended: 'quarterly',
      survey: 'quarterly',
      surveyExtended: 'semiannual',
      source: QUOTED,
    },
    {
      classes: [3, 4],
      types: ['A'],
      accuracyTest: 'quarterly',
      accuracyTestExtended: 'semiannual',
      survey: 'quarterly',
      surveyExtended: 'annual',
      source: RECALLED_WEAKLY,
    },
    {
      classes: [5],
      types: ['D'],
      accuracyTest: 'biweekly',
      accuracyTestExtended: 'monthly',
      survey: 'quarterly',
      surveyExtended: 'semiannual',
      source: RECALLED,
    },
    {
      classes: [5],
      types: ['B', 'C'],
      accuracyTest: 'monthly',
      accuracyTestExtended: 'quarterly',
      survey: 'quarterly',
      surveyExtended: 'semiannual',
      source: DESCRIBED,
    },
    {
      classes: [5],
      types: ['A'],
      accuracyTest: 'quarterly',
      accuracyTestExtended: 'semiannual',
      survey: 'quarterly',
      surveyExtended: 'annual',
      source: RECALLED_WEAKLY,
    },
    {
      classes: [6],
      types: ['E'],
      accuracyTest: 'semiannual',
      accuracyTestExtended: 'semiannual',
      survey: 'annual',
      surveyExtended: 'annual',
      source: RECALLED,
    },
  ],
};
