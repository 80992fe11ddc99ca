import type { Table } from '../table';

/** How often a processor proves its chemical film line. */
export interface FilmControlRow {
  readonly check: 'solution_analysis' | 'corrosion_and_adhesion';
  /** Never more days apart than this; and again whenever the line is started up. */
  readonly mostDays: number;
}

const PAGE = {
  document: 'MIL-DTL-5541F 4.2.1.1',
  confidence: 'read',
  certainty: 'high',
  address: 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-DTL-5541/page6.html',
} as const;

export const FILM_CONTROL: Table<FilmControlRow> = {
  id: 'film-control',
  title: 'Process control of chemical film',
  edition: 'MIL-DTL-5541F 4.2.1.1',
  rows: [
    { check: 'solution_analysis', mostDays: 7, source: PAGE },
    { check: 'corrosion_and_adhesion', mostDays: 35, source: PAGE },
  ],
};
