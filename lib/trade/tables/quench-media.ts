import type { Source } from '../source';
import type { Table } from '../table';

export const QUENCH_MEDIA = ['cold water', 'hot water', 'boiling water', 'polymer', 'spray'] as const;
export type QuenchMedium = (typeof QUENCH_MEDIA)[number];

export const QUENCH_RULES = ['faa', 'mil_h_6088g', 'ams_2770', 'consultant', 'trade_article'] as const;
/** Whose figures: they differ, so that a check has to say by which. */
export type QuenchRule = (typeof QUENCH_RULES)[number];

export interface QuenchBathRow {
  readonly rule: QuenchRule;
  readonly medium: QuenchMedium;
  readonly startF?: { readonly from?: number; readonly to: number };
  readonly maxRiseF?: number;
  readonly anyTimeToF?: number;
  readonly maxConcentrationPercent?: number;
}

const memory = (document: string, certainty: Source['certainty']): Source => ({
  document,
  confidence: 'memory',
  certainty,
});

/** Temperature of the quench at its start, and how warm it may get. */
export const QUENCH_BATHS: Table<QuenchBathRow> = {
  id: 'quench-baths',
  title: 'Quench media for aluminium',
  edition: 'FAA-H-8083-30, MIL-H-6088G, AMS 2770 and others, each by itself',
  rows: [
    {
      rule: 'faa',
      medium: 'cold water',
      startF: { to: 85 },
      maxRiseF: 20,
      source: memory('FAA-H-8083-30 cold-water quenching', 'high'),
    },
    {
      rule: 'faa',
      medium: 'hot water',
      startF: { from: 150, to: 180 },
      source: memory('FAA-H-8083-30 hot-water quenching', 'high'),
    },
    { rule: 'faa', medium: 'spray', source: memory('FAA-H-8083-30', 'high') },
    {
      rule: 'mil_h_6088g',
      medium: 'cold water',
      startF: { to: 100 },
      anyTimeToF: 110,
      source: memory('MIL-H-6088G quench requirements', 'medium'),
    },
    {
      rule: 'ams_2770',
      medium: 'cold water',
      startF: { to: 90 },
      anyTimeToF: 110,
      source: memory('AMS 2770', 'medium'),
    },
    {
      rule: 'ams_2770',
      medium: 'boiling water',
      startF: { from: 212, to: 212 },
      source: memory('ANSI H35.1 / AMS 2770', 'high'),
    },
    {
      rule: 'consultant',
      medium: 'cold water',
      startF: { to: 90 },
      maxRiseF: 10,
      source: {
        document: 'consultant page',
        confidence: 'read',
        certainty: 'medium',
        address: 'http://www.croucher.us/water-quenching',
      },
    },
    {
      rule: 'trade_article',
      medium: 'polymer',
      maxConcentrationPercent: 25,
      source: {
        document: 'trade article',
        confidence: 'read',
        certainty: 'medium',
        address:
          'https://www.industrialheating.com/blogs/14-industrial-heating-experts-speak-blog/post/89176-solutionize-quench-and-precipitation-of-aluminum-alloys-part-2',
      },
    },
  ],
};
