import type { Source } from '../source';
import type { Table } from '../table';

const PAGE = 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-1537';
const ofMilStd1537 = (clause: string, page: number): Source => ({
  document: `MIL-STD-1537C para ${clause}`,
  confidence: 'read',
  certainty: 'high',
  address: `${PAGE}/page${page}.html`,
});

/** What must be minded when hardness and conductivity of aluminium are measured; the figure where there is one. */
export type MeasuringRuleRow =
  | { readonly rule: 'pair_decides' | 'clad_needs_correlation' }
  | { readonly rule: 'temperature_difference'; readonly mostC: number; readonly mostF: number }
  | { readonly rule: 'lift_off_correction'; readonly overIn: number }
  | {
      readonly rule: 'stack_thin_sheet';
      readonly alloy: string;
      readonly condition: string;
      readonly kHz: number;
      readonly leastIn: number;
    }
  | { readonly rule: 'operator'; readonly indirect: 'nas_410_level_2'; readonly direct: 'trained' }
  | { readonly rule: 'brinell'; readonly kgf: number; readonly ballMm: number; readonly holdS: number }
  /** The text gives no range; this is the span of the usual alloys. */
  | {
      readonly rule: 'rough_tensile';
      readonly ksiPerHb500: number;
      readonly hb500Range: readonly [number, number];
    };

export const MEASURING_RULES: Table<MeasuringRuleRow> = {
  id: 'measuring-rules',
  title: 'Measuring hardness and conductivity of aluminium',
  edition: 'MIL-STD-1537C and T.O. 1-1A-9',
  rows: [
    { rule: 'pair_decides', source: ofMilStd1537('5.1.2.1', 15) },
    { rule: 'temperature_difference', mostC: 3, mostF: 5.4, source: ofMilStd1537('5.1.2', 15) },
    { rule: 'lift_off_correction', overIn: 0.003, source: ofMilStd1537('5.1.4', 16) },
    { rule: 'clad_needs_correlation', source: ofMilStd1537('4.4.3-4.4.4', 13) },
    {
      rule: 'stack_thin_sheet',
      alloy: '7075',
      condition: 'T6',
      kHz: 60,
      leastIn: 0.05,
      source: ofMilStd1537('4.4.3-4.4.4', 13),
    },
    { rule: 'operator', indirect: 'nas_410_level_2', direct: 'trained', source: ofMilStd1537('4.5', 15) },
    {
      rule: 'brinell',
      kgf: 500,
      ballMm: 10,
      holdS: 30,
      source: {
        document: 'T.O. 1-1A-9 para 3-225',
        confidence: 'read',
        certainty: 'high',
        address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_199.htm',
      },
    },
    {
      rule: 'rough_tensile',
      ksiPerHb500: 0.56,
      hb500Range: [30, 160],
      source: {
        document: 'Design text, for rough identification only',
        confidence: 'read',
        certainty: 'medium',
        address: 'https://www.scribd.com/document/390430133/Aluminum-Manual-66',
      },
    },
  ],
};
