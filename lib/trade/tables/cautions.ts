import type { CautionRow } from '../cautions/cautions-for';
import type { Process } from '../process';
import { COMMON_PRACTICE, type Source } from '../source';
import type { Table } from '../table';

const read = (document: string, address: string): Source => ({
  document,
  confidence: 'read',
  certainty: 'high',
  address,
});
const recalled = (document: string, certainty: Source['certainty'] = 'high'): Source => ({
  document,
  confidence: 'memory',
  certainty,
});

const TITLE_8 = 'http://www.dir.ca.gov/title8/5188.html';
const ORDER_1_1A_9 = 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_169.htm';
const SALT_WRITER = read(
  'Industrial heat-treat writer on salt baths',
  'https://www.industrialheating.com/blogs/14-industrial-heating-experts-speak-blog/post/93206-article-headline',
);
const ASTM_B850 = 'https://pt.scribd.com/document/394242388/astm-b850-pdf';

const SOLUTION: readonly Process[] = ['solution_heat_treat_and_age', 'solution_heat_treat'];
const QUENCHED: readonly Process[] = [...SOLUTION, 'harden_and_temper'];
const HEATED: readonly Process[] = [
  ...QUENCHED,
  'artificial_age',
  'anneal',
  'stress_relief',
  'embrittlement_relief',
];
const PLATED: readonly Process[] = ['cadmium_plate', 'zinc_plate', 'nickel_plate', 'chromium_plate'];
const IN_ACID: readonly Process[] = [...PLATED, 'phosphate'];
const HEXAVALENT: readonly Process[] = [
  'chromium_plate',
  'chemical_film',
  'anodize',
  'cadmium_plate',
  'zinc_plate',
];
const STEELS = ['low_alloy_steel', 'precipitation_hardening_steel'] as const;

/** The customary cautions in short words of our own. They come after the rules of the place. */
export const CAUTIONS: Table<CautionRow> = {
  id: 'cautions',
  title: 'Customary cautions',
  edition: 'Collected from regulations, manuals and practices, 2026',
  rows: [
    {
      processes: 'any',
      says: 'Only the work asked here, to the specification at the revision named.',
      onPapers: true,
      source: COMMON_PRACTICE,
    },
    {
      processes: 'any',
      says: 'Keep the lots apart; each line comes back with its lot number.',
      onPapers: true,
      source: COMMON_PRACTICE,
    },
    {
      processes: 'any',
      says: 'If anything here and the order differ, stop and call.',
      onPapers: true,
      source: COMMON_PRACTICE,
    },
    {
      processes: HEATED,
      families: ['magnesium'],
      says: 'Magnesium: never into nitrate salt. Keep chips and fines from fire; no water on burning metal.',
      onPapers: true,
      source: read(
        'T.O. 1-1A-9 section 4; maker’s page on magnesium',
        'https://aluminumsheetstrailers.com/faq/133.html',
      ),
    },
    {
      processes: QUENCHED,
      says: 'Salt bath: parts go in clean and dry; trapped water explodes as steam.',
      onPapers: true,
      source: read('T.O. 1-1A-9 para 3-61; Cal. Title 8 s5188(a)(1)', ORDER_1_1A_9),
    },
    {
      processes: SOLUTION,
      says: 'Nitrate salt: never add cyanide or anything organic.',
      onPapers: true,
      source: read('Cal. Title 8 s5188(b)(1)', TITLE_8),
    },
    {
      processes: SOLUTION,
      says: 'Nitrate salt: never above 1200 °F by that code; aluminium baths run far lower, about 350 to 1000 °F.',
      onPapers: false,
      source: read('Cal. Title 8 s5188(b)(2); trade', TITLE_8),
    },
    {
      processes: QUENCHED,
      says: 'Salt bath: face shield, goggles, insulated sleeves, trousers and spats; an empty bath is a confined space.',
      onPapers: false,
      source: SALT_WRITER,
    },
    {
      processes: QUENCHED,
      says: 'Molten salt on skin goes on burning until it has set.',
      onPapers: false,
      source: SALT_WRITER,
    },
    {
      processes: QUENCHED,
      says: 'Quench: oil burns; keep a margin below its flash point, and stand clear of hot loads.',
      onPapers: false,
      source: {
        document: 'Heat-treat safety literature',
        confidence: 'read',
        certainty: 'medium',
        address: 'https://dl.asminternational.org/heat-treating/proceedings/HT2013/84116/311/34274',
      },
    },
    {
      processes: HEATED,
      says: 'The furnace chart is a record: keep it with the lot and send it back.',
      onPapers: true,
      source: recalled('AMS 2750 practice'),
    },
    {
      processes: [...IN_ACID, 'embrittlement_relief'],
      families: STEELS,
      says: 'Hydrogen embrittlement breaks late and without warning: hold the parts until the bake is proved.',
      onPapers: true,
      source: read('ASTM B850 introduction', ASTM_B850),
    },
    {
      processes: [...IN_ACID, 'embrittlement_relief'],
      families: STEELS,
      says: 'A bake does not guarantee that no hydrogen embrittlement is left.',
      onPapers: true,
      source: read('ASTM B850-98', 'http://sonicplatinginc.com/services/baking-process/bake-chart/'),
    },
    {
      processes: ['cadmium_plate'],
      says: 'Cadmium: exposure limit 5 µg/m³, action level 2.5; regulated area, no dry sweeping.',
      onPapers: false,
      source: recalled('29 CFR 1910.1027'),
    },
    {
      processes: ['cadmium_plate'],
      says: 'Cadmium fumes above about 450 to 610 °F: never weld, burn or overheat plated parts.',
      onPapers: true,
      source: recalled('QQ-P-416 notes'),
    },
    {
      processes: HEXAVALENT,
      says: 'Hexavalent chromium, where the process uses it: exposure limit 5 µg/m³, action level 2.5.',
      onPapers: true,
      source: recalled('29 CFR 1910.1026'),
    },
    {
      processes: [...IN_ACID, 'anodize', 'chemical_film', 'passivation', 'fluorescent_penetrant'],
      says: 'Etch and acid lines: hydrofluoric and nitric acid burn; never let cyanide and acid meet.',
      onPapers: false,
      source: recalled('OSHA and plating practice'),
    },
    {
      processes: ['passivation'],
      says: 'Nitric acid with dichromate: fumes, and waste with hexavalent chromium.',
      onPapers: true,
      source: recalled('ASTM A967 context', 'medium'),
    },
    {
      processes: ['fluorescent_penetrant', 'magnetic_particle'],
      says: 'UV-A lamps: a cracked filter lets UV-B through; no photochromic glasses; spare skin and eyes.',
      onPapers: true,
      source: recalled('ASTM E1417 and E3022 practice'),
    },
    {
      processes: ['fluorescent_penetrant'],
      says: 'Penetrant takes the fat from skin, and carriers burn: gloves, and air for the dryers.',
      onPapers: false,
      source: recalled('T.O. 33B-1-1'),
    },
  ],
};
