import type { Alloy } from '../alloys/alloy';
import type { ProductForm } from '../process';
import type { Certainty, Source } from '../source';
import type { Table } from '../table';

/** Rivet wire is no form a part is made in, but has a range of its own. */
export type HeatTreatForm = Exclude<ProductForm, 'casting'> | 'rivet wire';

export interface SolutionRow {
  readonly alloys: readonly Alloy[] | 'any';
  readonly forms: readonly HeatTreatForm[] | 'any';
  /** Nothing where the source gives a set point alone. */
  readonly rangeF?: readonly [number, number];
  readonly setPointF?: readonly [number, number];
  /** Above it the range holds for thin sheet alone, since metal that is not homogeneous begins to melt. */
  readonly meltingRiskAboveF?: number;
  /** Clad metal is usually held below. */
  readonly cladHighF?: number;
  readonly holdWithinF?: number;
  readonly soakMin?: readonly [number, number];
}

const DOCUMENT =
  'MIL-H-6088G (1 Apr 1991) table of solution heat-treating temperatures; T.O. 1-1A-9 Table 3-7';
const memory = (certainty: Certainty): Source => ({ document: DOCUMENT, confidence: 'memory', certainty });
const HIGH = memory('high');
const MEDIUM = memory('medium');

/** Ranges that govern. More exact forms stand before `any`. */
export const SOLUTION_TEMPERATURES: Table<SolutionRow> = {
  id: 'solution-temperatures',
  title: 'Solution heat treatment temperatures of wrought aluminium',
  edition: DOCUMENT,
  rows: [
    { alloys: ['2014'], forms: 'any', rangeF: [925, 945], setPointF: [935, 935], source: HIGH },
    { alloys: ['2017'], forms: 'any', rangeF: [925, 950], setPointF: [935, 935], source: HIGH },
    { alloys: ['2117'], forms: ['rivet wire'], rangeF: [925, 950], setPointF: [935, 935], source: MEDIUM },
    { alloys: ['2117'], forms: 'any', rangeF: [890, 950], setPointF: [935, 935], source: MEDIUM },
    { alloys: ['2024'], forms: 'any', rangeF: [910, 930], setPointF: [920, 920], source: HIGH },
    { alloys: ['2219'], forms: 'any', rangeF: [985, 1005], setPointF: [995, 995], source: HIGH },
    { alloys: ['6013'], forms: ['sheet'], rangeF: [1030, 1065], setPointF: [1055, 1055], source: MEDIUM },
    { alloys: ['6061'], forms: 'any', rangeF: [960, 1010], setPointF: [985, 985], source: HIGH },
    { alloys: ['6063'], forms: ['extrusion'], rangeF: [960, 1010], setPointF: [985, 985], source: MEDIUM },
    { alloys: ['7050'], forms: 'any', rangeF: [880, 900], setPointF: [890, 890], source: HIGH },
    {
      alloys: ['7075'],
      forms: ['sheet'],
      rangeF: [860, 930],
      setPointF: [870, 870],
      meltingRiskAboveF: 900,
      cladHighF: 920,
      source: MEDIUM,
    },
    {
      alloys: ['7075'],
      forms: ['plate', 'bar', 'forging'],
      rangeF: [860, 900],
      setPointF: [870, 890],
      source: MEDIUM,
    },
    { alloys: ['7075'], forms: ['extrusion'], rangeF: [860, 880], setPointF: [870, 870], source: MEDIUM },
    { alloys: ['7178'], forms: ['sheet'], rangeF: [860, 930], setPointF: [875, 875], source: MEDIUM },
    {
      alloys: ['7178'],
      forms: ['plate', 'bar', 'tube', 'extrusion', 'forging'],
      rangeF: [860, 880],
      setPointF: [870, 870],
      source: memory('low'),
    },
  ],
};

const PRODUCER: Source = {
  document: 'aluminium producer heat-treat data page (alloys 6013/6061)',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://it.scribd.com/document/396525084/Tratamientos-termicos-aluminio',
};
const HANDBOOK: Source = {
  document: 'FAA-H-8083-30 (AMT General), heat treatment of nonferrous metals',
  confidence: 'read',
  certainty: 'high',
  address: 'http://www.flight-mechanic.com/heat-treatment-of-nonferrous-metals-part-two/',
};
const SECONDARY: Source = {
  document: 'secondary web page',
  confidence: 'read',
  certainty: 'low',
  address:
    'http://ww.substech.com/dokuwiki/doku.php?do=export_xhtml&id=wrought_aluminum-zinc-magnesium_alloy_7075',
};

/** The producer's figures for two alloys and a secondary one for 7075, to compare with the ranges that govern. */
export const SOLUTION_TEMPERATURES_PRODUCER: Table<SolutionRow> = {
  id: 'solution-temperatures-producer',
  title: 'Solution heat treatment temperatures on data pages',
  edition: 'Producer data page and a secondary page',
  rows: [
    { alloys: ['6061'], forms: 'any', setPointF: [985, 985], source: PRODUCER },
    {
      alloys: ['6013'],
      forms: 'any',
      rangeF: [1050, 1060],
      setPointF: [1055, 1055],
      soakMin: [20, 30],
      source: PRODUCER,
    },
    { alloys: ['7075'], forms: 'any', setPointF: [900, 900], source: SECONDARY },
  ],
};

/** The handbook's band over all alloys, with how closely the metal is held. */
export const SOLUTION_TEMPERATURES_HANDBOOK: Table<SolutionRow> = {
  id: 'solution-temperatures-handbook',
  title: 'Solution heat treatment temperatures, all alloys',
  edition: 'FAA-H-8083-30',
  rows: [{ alloys: 'any', forms: 'any', rangeF: [825, 980], holdWithinF: 10, source: HANDBOOK }],
};

/** What one processor says its furnaces cover. */
export const SOLUTION_TEMPERATURES_PROCESSOR: Table<SolutionRow> = {
  id: 'solution-temperatures-processor',
  title: 'Solution heat treatment temperatures in use at a processor',
  edition: 'Processor data page',
  rows: [
    {
      alloys: 'any',
      forms: 'any',
      rangeF: [842, 1067],
      source: {
        document: 'processor data page',
        confidence: 'read',
        certainty: 'medium',
        address: 'http://www.bodycote.com/en/services/heat-treatment/solution-and-age/aluminium-alloys.aspx',
      },
    },
  ],
};
