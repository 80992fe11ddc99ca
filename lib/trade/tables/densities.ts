import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface DensityRow {
  readonly alloys: readonly Alloy[];
  /** Conditions the figure holds for; without them it holds for all. */
  readonly conditions?: readonly string[];
  readonly lbPerIn3: number;
}

const DOCUMENT = 'Aluminum Association / MIL-HDBK-5 nominal densities';
const read = (address: string): Source => ({
  document: DOCUMENT,
  confidence: 'read',
  certainty: 'high',
  address,
});
const PROPERTIES = read('https://tubingchina.com/Physical-Properties-of-Aluminium-Alloys.htm');
const TUBES_7075 = read('https://btimetals.com/aerospace_metal/aluminium_7075_tubes');
const TO_1_1A_9 = read('https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_161.htm');
const MEMORY: Source = { document: DOCUMENT, confidence: 'memory', certainty: 'high' };

/** Nominal densities as printed, in pounds per cubic inch. */
export const DENSITIES: Table<DensityRow> = {
  id: 'densities',
  title: 'Nominal densities',
  edition: DOCUMENT,
  rows: [
    { alloys: ['1100'], lbPerIn3: 0.098, source: PROPERTIES },
    { alloys: ['2014', '2017'], lbPerIn3: 0.101, source: MEMORY },
    { alloys: ['2024'], lbPerIn3: 0.1, source: PROPERTIES },
    { alloys: ['2117'], lbPerIn3: 0.099, source: MEMORY },
    { alloys: ['2219'], lbPerIn3: 0.103, source: MEMORY },
    { alloys: ['3003'], lbPerIn3: 0.099, source: PROPERTIES },
    { alloys: ['5052'], lbPerIn3: 0.097, source: PROPERTIES },
    { alloys: ['5083'], lbPerIn3: 0.096, source: MEMORY },
    { alloys: ['5056'], lbPerIn3: 0.096, source: PROPERTIES },
    { alloys: ['6013'], lbPerIn3: 0.098, source: MEMORY },
    { alloys: ['6061'], lbPerIn3: 0.098, source: PROPERTIES },
    { alloys: ['6063'], lbPerIn3: 0.097, source: MEMORY },
    { alloys: ['7050'], lbPerIn3: 0.102, source: MEMORY },
    { alloys: ['7075'], lbPerIn3: 0.101, source: TUBES_7075 },
    { alloys: ['7178'], lbPerIn3: 0.102, source: MEMORY },
    { alloys: ['7475'], lbPerIn3: 0.101, source: MEMORY },
    { alloys: ['pure aluminium'], lbPerIn3: 0.098, source: TO_1_1A_9 },
    { alloys: ['A356', '357'], lbPerIn3: 0.097, source: MEMORY },
    { alloys: ['AZ31B'], lbPerIn3: 0.0639, source: MEMORY },
    { alloys: ['AZ91'], lbPerIn3: 0.065, source: MEMORY },
    { alloys: ['Ti CP'], lbPerIn3: 0.163, source: MEMORY },
    { alloys: ['Ti-6Al-4V'], lbPerIn3: 0.16, source: MEMORY },
    { alloys: ['4130', '4340', '300M'], lbPerIn3: 0.283, source: MEMORY },
    { alloys: ['17-4PH'], conditions: ['H900'], lbPerIn3: 0.282, source: MEMORY },
    {
      alloys: ['17-4PH'],
      conditions: ['H1025', 'H1075', 'H1100', 'H1150'],
      lbPerIn3: 0.284,
      source: MEMORY,
    },
    { alloys: ['15-5PH'], lbPerIn3: 0.283, source: MEMORY },
    { alloys: ['17-7PH'], lbPerIn3: 0.276, source: MEMORY },
    { alloys: ['304', '321', '347'], lbPerIn3: 0.286, source: MEMORY },
    { alloys: ['316'], lbPerIn3: 0.288, source: MEMORY },
    { alloys: ['A-286'], lbPerIn3: 0.287, source: MEMORY },
    { alloys: ['Inconel 718'], lbPerIn3: 0.297, source: MEMORY },
    { alloys: ['Inconel 625'], lbPerIn3: 0.305, source: MEMORY },
    { alloys: ['Monel 400'], lbPerIn3: 0.319, source: MEMORY },
    { alloys: ['copper'], lbPerIn3: 0.323, source: MEMORY },
    { alloys: ['beryllium copper'], lbPerIn3: 0.298, source: MEMORY },
    { alloys: ['cartridge brass'], lbPerIn3: 0.308, source: MEMORY },
    { alloys: ['aluminium bronze'], lbPerIn3: 0.274, source: MEMORY },
    { alloys: ['cadmium'], lbPerIn3: 0.312, source: MEMORY },
    { alloys: ['nickel'], lbPerIn3: 0.322, source: MEMORY },
    { alloys: ['chromium'], lbPerIn3: 0.26, source: MEMORY },
    { alloys: ['zinc'], lbPerIn3: 0.258, source: MEMORY },
  ],
};
