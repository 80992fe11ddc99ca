import type { CallOutRow } from '../lineage/call-out-findings';
import type { Source } from '../source';
import type { Table } from '../table';

const read = (document: string, address?: string): Source => ({
  document,
  confidence: 'read',
  certainty: 'high',
  ...(address !== undefined && { address }),
});

const TYPE_DEFAULT = read('MIL-DTL-5541F technical notes', 'https://aotco.com/mil-dtl-5541f-technical-notes');
const PASSIVATION = read('AMS2700F cover and notice; AMS2700E classification');
const LOST_GUIDANCE = read(
  'Discussion at eng-tips.com',
  'https://eng-tips.com/threads/ams-2700-which-type-with-which-grade.153287/post-705408',
);
const SCOPE_6088 = read(
  'MIL-H-6088G 1.1',
  'https://fdocuments.net/document/mil-h-6088g-heat-treatment-of-aluminum-alloys.html',
);
const NOTICE_6088 = read(
  'AMS-H-6088C cancellation notice',
  'https://scribd.com/document/674330861/SAE-AMS-H-6088-C',
);
const SCOPE_6875 = read('AMS-H-6875B scope', 'https://webstore.ansi.org/Standards/SAE/SAEAMS6875B2010');
const STEEL_FAMILY = read('AMS2759D', 'https://zh.scribd.com/document/370328189/AMS-2759D');
const CADMIUM = read('QQ-P-416F', 'https://docslib.org/doc/714548/ams-qq-p-416-pdf');
const ZINC: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};
const PENETRANT = read(
  'History of the penetrant material specification',
  'https://ndtlibrary.asnt.org/2015/HistoricalDevelopmentoftheSpecificationthatQualifiesPenetrants',
);

export const CALL_OUT_NOTES: Table<CallOutRow> = {
  id: 'call-out-notes',
  title: 'What a call-out silently means',
  edition: 'Collected from specifications and notices, 2026',
  rows: [
    ...['MIL-DTL-5541', 'MIL-C-5541'].map((number) => ({
      number,
      when: 'no_type_stated' as const,
      note: 'type_i_hexavalent_applies' as const,
      asksEngineering: false,
      source: TYPE_DEFAULT,
    })),
    ...['QQ-P-35', 'AMS-QQ-P-35'].flatMap((number) => [
      {
        number,
        when: 'always' as const,
        note: 'nitric_unless_engineering_allows_citric' as const,
        asksEngineering: false,
        source: PASSIVATION,
      },
      {
        number,
        when: 'always' as const,
        note: 'acceptance_class_4_applies' as const,
        asksEngineering: false,
        source: PASSIVATION,
      },
      {
        number,
        when: 'no_type_stated' as const,
        note: 'type_guidance_lost' as const,
        asksEngineering: true,
        source: LOST_GUIDANCE,
      },
    ]),
    {
      number: 'MIL-H-6088',
      revisions: ['G'],
      when: 'for_parts',
      note: 'excludes_parts',
      asksEngineering: true,
      source: SCOPE_6088,
    },
    {
      number: 'AMS-H-6088',
      when: 'always',
      note: 'number_forks_by_product',
      asksEngineering: false,
      source: NOTICE_6088,
    },
    {
      number: 'AMS-H-6875',
      revisions: ['B'],
      when: 'for_parts',
      note: 'raw_material_only',
      asksEngineering: true,
      source: SCOPE_6875,
    },
    {
      number: 'AMS2759',
      when: 'always',
      note: 'pulls_in_slash_sheet',
      asksEngineering: false,
      source: STEEL_FAMILY,
    },
    ...['QQ-P-416', 'AMS-QQ-P-416'].map((number) => ({
      number,
      when: 'always' as const,
      note: 'not_over_200_ksi_unless_specified' as const,
      asksEngineering: false,
      source: CADMIUM,
    })),
    {
      number: 'QQ-Z-325',
      when: 'always',
      note: 'classes_do_not_map',
      asksEngineering: true,
      source: ZINC,
    },
    {
      number: 'MIL-I-25135',
      revisions: ['original'],
      when: 'always',
      note: 'no_sensitivity_level_in_first_issue',
      asksEngineering: true,
      source: PENETRANT,
    },
  ],
};
