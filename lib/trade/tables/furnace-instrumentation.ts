import type { InstrumentationRow, InstrumentationType } from '../pyrometry/instrumentation';
import type { Source } from '../source';
import type { Table } from '../table';
import { mmFromInches } from '../units/length';

/** Control and recording were read; the rest is from memory. */
const PARTLY_READ: Source = {
  document: 'AMS 2750E and F, instrumentation table',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://www.keithcompany.com/ams2750e-cqi9-furnace-specifications.html',
};

const row = (type: InstrumentationType, has: Partial<InstrumentationRow>) => ({
  controlPerZone: true,
  recordsControl: true,
  recordsHottestAndColdest: false,
  loadSensor: false,
  extraRecordingAtLeastMm: null,
  overTemperature: true,
  ...has,
  type,
  source: PARTLY_READ,
});

export const FURNACE_INSTRUMENTATION: Table<InstrumentationRow> = {
  id: 'furnace-instrumentation',
  title: 'Instrumentation types',
  edition: 'AMS 2750F (2020-06)',
  rows: [
    row('A', { recordsHottestAndColdest: true, loadSensor: true }),
    row('B', { loadSensor: true }),
    row('C', { recordsHottestAndColdest: true }),
    row('D+', { extraRecordingAtLeastMm: mmFromInches(3) }),
    row('D', {}),
    row('E', { recordsControl: false }),
  ],
};
