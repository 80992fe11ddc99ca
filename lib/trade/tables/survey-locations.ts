import type { SurveyLocationRow } from '../pyrometry/survey-locations';
import type { Table } from '../table';

export const SURVEY_LOCATIONS: Table<SurveyLocationRow> = {
  id: 'survey-locations',
  title: 'Places of an older uniformity survey in an air furnace',
  edition: 'T.O. 1-1A-9 para 3-65',
  rows: [
    {
      atLeast: 9,
      onePerFt3: 25,
      controlWithinF: 5,
      source: {
        document: 'T.O. 1-1A-9 paras 3-63 and 3-65',
        confidence: 'read',
        certainty: 'high',
        address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_169.htm',
      },
    },
  ],
};
