import type { LabelKey } from './labels';

export type ReadingKind =
  'hardness' | 'conductivity' | 'thickness' | 'tensile' | 'yield' | 'elongation' | 'coating_weight';

interface Unit {
  readonly pattern: RegExp;
  /** One way of writing it. */
  readonly name: string;
  /** Outside of it no such reading exists. */
  readonly range: readonly [number, number];
}

const ROCKWELL = String.raw`H\s?R\s?`;
export const UNITS: Record<ReadingKind, readonly Unit[]> = {
  hardness: [
    ...['15T', '30T', '45T', '15N', '30N', '45N', 'A', 'B', 'C', 'E', 'F', 'G', 'H', 'K'].map((scale) => ({
      pattern: new RegExp(
        `(?<![\\p{L}])(?:${ROCKWELL}${scale}W?|R\\s?${scale}|Rockwell\\s?["“']?${scale}["”']?)(?![\\p{L}])`,
        'iu',
      ),
      name: `HR${scale}`,
      range: [10, 130] as const,
    })),
    { pattern: /(?<![\p{L}])(?:HV\s?\d{0,2}|DPH|VHN|Vickers)(?![\p{L}])/iu, name: 'HV', range: [30, 1100] },
    { pattern: /(?<![\p{L}])(?:HBW?|BHN|Brinell)(?![\p{L}])/iu, name: 'HBW', range: [30, 700] },
  ],
  conductivity: [
    { pattern: /%?\s?I\.?A\.?C\.?S\.?/iu, name: '%IACS', range: [10, 65] },
    { pattern: /MS\s?\/\s?m/iu, name: 'MS/m', range: [5, 40] },
  ],
  thickness: [
    {
      pattern: /(?:µ|μ|u|p)[\s-]?in(?:ch(?:es)?)?\b|micro-?\s?inch(?:es)?|millionths/iu,
      name: 'microinch',
      range: [2, 5000],
    },
    { pattern: /(?<![\p{L}])mils?(?![\p{L}-])/iu, name: 'mil', range: [0.005, 10] },
    {
      pattern:
        /(?:µ|μ)m|(?<=\d\s?)[ypj]m(?![\p{L}])|(?<![\p{L}])(?:um|microns?|micrometers?|micrometres?|mikrometer)(?![\p{L}])/iu,
      name: 'µm',
      range: [0.05, 250],
    },
    {
      pattern: /(?<![\p{L}])(?:inch(?:es)?|in\.?)(?![\p{L}])|(?<=\d)["”″]/iu,
      name: 'in',
      range: [0.000005, 0.0099],
    },
    { pattern: /(?<![\p{L}])mm(?![\p{L}])/iu, name: 'mm', range: [0.0001, 0.25] },
  ],
  tensile: [
    { pattern: /(?<![\p{L}])ksi(?![\p{L}])/iu, name: 'ksi', range: [10, 400] },
    { pattern: /(?<![\p{L}])(?:MPa|N\/mm[²2]?)(?![\p{L}])/iu, name: 'MPa', range: [60, 2800] },
    { pattern: /(?<![\p{L}])psi(?![\p{L}])/iu, name: 'psi', range: [9000, 400000] },
  ],
  yield: [
    { pattern: /(?<![\p{L}])ksi(?![\p{L}])/iu, name: 'ksi', range: [5, 400] },
    { pattern: /(?<![\p{L}])(?:MPa|N\/mm[²2]?)(?![\p{L}])/iu, name: 'MPa', range: [30, 2800] },
    { pattern: /(?<![\p{L}])psi(?![\p{L}])/iu, name: 'psi', range: [5000, 400000] },
  ],
  elongation: [{ pattern: /%/u, name: '%', range: [0.5, 80] }],
  coating_weight: [
    { pattern: /mg\s?\/\s?(?:sq\.?\s?)?ft(?:[²2])?|g\/m[²2]/iu, name: 'mg/ft²', range: [1, 10000] },
  ],
};

export const SAID: Record<ReadingKind, RegExp> = {
  hardness: /\b(?:hardness|rockwell|brinell|vickers|h[aä]rte\w*|duret[eé]|dureza)\b/iu,
  conductivity: /\b(?:conductivity|leitf[aä]higkeit|conductivit[eé]|conductividad)\b/iu,
  thickness:
    /\b(?:(?:coating|plating|plate|deposit|film|cadmium|zinc|local|average)\s+)?(?:thickness(?:es)?|schichtdicke|[eé]paisseur|espesor)\b/iu,
  tensile: /\b(?:tensile|u\.?t\.?s\.?|zugfestigkeit)\b/iu,
  yield: /\b(?:yield|streckgrenze)\b/iu,
  elongation: /\b(?:elongation|bruchdehnung)\b/iu,
  coating_weight: /\b(?:coating|film) weight\b/iu,
};

export const NUMBERS = String.raw`\d+(?:[.,]\d+)?(?:\s*[,;/|&]\s*\d+(?:[.,]\d+)?)*`;

export const KINDS = Object.keys(UNITS) as ReadingKind[];
export const isKind = (key: LabelKey): key is ReadingKind & LabelKey => (KINDS as string[]).includes(key);
