import type { Certainty, Confidence, Source } from '../source';
import type { Table } from '../table';
import type { OrderRuleId, OrderRuleRow, Severity } from './order-rule';

const STANDARDS_PAGE = 'https://ndls.org.cn/standard/detail/fb39d8766cf93078e63b336ab359a3f7';
const BAKE_CHART = 'http://sonicplatinginc.com/services/baking-process/bake-chart/';
const ASTM_PAGE =
  'https://www.astm.org/products-services/standards-and-publications/standards/workitem-wk81648';
const TO_FORMING = 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_166.htm';
const TEST_HOUSE = 'https://americantestingservices.com/surface-preparation-inspection-techniques/';
const ETCH_PAGE = 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-867/page14.html';
const PEENING_FORUM = 'https://www.shotpeener.com/forums/ubbthreads.php?ubb=showthreaded&Number=436&an=';
const PEENING_TABLE =
  'https://www.yumpu.com/en/document/view/13851658/ams-s-13165-metal-improvement-company/20';
const PEENING_CLAUSE =
  'https://www.yumpu.com/en/document/view/13851658/ams-s-13165-metal-improvement-company/7';
const SAFETY_PAGE = 'https://aluminumsheetstrailers.com/faq/133.html';
const TO_HEAT_TREAT = 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_169.htm';
const NAVY_MANUAL =
  'https://navyaviation.tpub.com/14315/Heat-Treatment-Of-Nonferrous-Metals-Aluminum-Alloys-253.html';
const CADMIUM_THREAD = 'https://eng-tips.com/threads/cadmium-plated-hardware-used-on-titanium-parts.332583';
const FILM_PAGE = 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-DTL-5541/page11.html';

interface Read {
  readonly confidence?: Confidence;
  readonly certainty?: Certainty;
  readonly at?: string;
}

type Row = OrderRuleRow & { readonly source: Source };

/** Without `at` the document is remembered, unless it says otherwise. */
const rule = (id: OrderRuleId, severity: Severity, document: string, read: Read = {}): Row => ({
  rule: id,
  severity,
  source: {
    document,
    confidence: read.confidence ?? (read.at === undefined ? 'memory' : 'read'),
    certainty: read.certainty ?? 'high',
    ...(read.at !== undefined && { address: read.at }),
  },
});

export const ORDER_RULES: Table<OrderRuleRow> = {
  id: 'order-rules',
  title: 'Order of steps',
  edition: 'The documents named in each row',
  rows: [
    rule('stress_relief_before_plating', 'blocker', 'ASTM B849 scope / QQ-P-416F', { at: STANDARDS_PAGE }),
    rule('bake_after_plating', 'blocker', 'ASTM B850-98', { at: BAKE_CHART }),
    rule('bake_before_chromate', 'note', 'QQ-P-416F; ASTM B849-family guide text', { at: ASTM_PAGE }),
    rule('straighten_before_age', 'note', 'AMS 2770'),
    rule(
      'age_after_straightening',
      'note',
      'AMS 2770; T.O. 1-1A-9 para 3-52 says most forming before artificial ageing',
      { at: TO_FORMING },
    ),
    rule('heat_before_finish', 'blocker', 'finish max temperatures (08a)'),
    rule('inspect_after_heat_treatment', 'blocker', 'ASTM E1444 restated', { at: TEST_HOUSE }),
    rule('temper_etch_after_grinding', 'warning', 'MIL-STD-867C 5.5, 5.6.3', { at: ETCH_PAGE }),
    rule('inspect_before_coating', 'blocker', 'ASTM E1444/E1417 restated by a test house', {
      at: TEST_HOUSE,
    }),
    rule('magnetic_particle_before_and_after_plating', 'blocker', 'ASTM E1444 restated', { at: TEST_HOUSE }),
    rule('demagnetise_before_plating', 'note', 'ASTM E1444'),
    rule('peen_before_plating', 'blocker', 'AMS-S-13165 / QQ-C-320'),
    rule(
      'no_heat_after_peening',
      'blocker',
      'AMS-S-13165 (475 F named by a user citing the spec; other figures memory)',
      { at: PEENING_FORUM, confidence: 'read+memory' },
    ),
    rule('no_hardening_of_peened', 'blocker', 'shop forum case', { at: PEENING_FORUM }),
    rule('bake_limit_of_peened_steel', 'note', 'MIL-STD-867C 5.5.1', { at: ETCH_PAGE }),
    rule('decontaminate_peened_aluminium', 'note', 'AMS-S-13165 Table VI note 5', { at: PEENING_TABLE }),
    rule('protect_peened', 'note', 'AMS-S-13165 3.3.10.3', { at: PEENING_CLAUSE }),
    rule('no_nitrate_for_magnesium', 'blocker', 'trade safety page; MIL-M-6857 practice', {
      at: SAFETY_PAGE,
      certainty: 'medium',
    }),
    rule('nitrate_attacks_alloy', 'warning', 'T.O. 1-1A-9 para 3-62', { at: TO_HEAT_TREAT }),
    rule('salt_trapped', 'warning', 'Navy aviation training manual', { at: NAVY_MANUAL }),
    rule('dry_before_salt', 'note', 'T.O. 1-1A-9 para 3-61', { at: TO_HEAT_TREAT }),
    rule('no_cadmium_on_titanium', 'blocker', 'QQ-P-416 6.1.1.1.1 as quoted by a user', {
      at: CADMIUM_THREAD,
    }),
    rule('no_cadmium_in_heat', 'blocker', 'QQ-P-416 6.1'),
    rule('no_cadmium_in_fuel', 'warning', 'QQ-P-416 6.1 / NASA practice', { certainty: 'medium' }),
    rule('no_anodize_with_inserts', 'blocker', 'MIL-A-8625 3.3.1.x'),
    rule('no_anodize_that_traps', 'blocker', 'MIL-A-8625D 3.3.1', { confidence: 'read' }),
    rule('prime_film_soon', 'note', 'MIL-DTL-5541F 6.12', { at: FILM_PAGE }),
    rule('no_oven_on_film', 'warning', 'MIL-DTL-5541F 6.14', { at: FILM_PAGE }),
    rule('count_clad_solution', 'note', 'T.O. 1-1A-9 Table 3-12', { at: TO_HEAT_TREAT }),
    rule('passivate_after_age', 'blocker', 'AMS 2700'),
    rule('passivate_free_machining', 'warning', 'ASTM A967 appendix', { certainty: 'medium' }),
    rule('case_before_plating', 'note', 'AMS 2759', { certainty: 'medium' }),
    rule('bake_below_temper', 'blocker', 'MIL-STD-867C 5.5 pattern', { at: ETCH_PAGE }),
    rule('temper_band', 'warning', 'steel practice', { certainty: 'medium' }),
    rule('no_bake_on_anodize', 'warning', 'MIL-A-8625 practice', { certainty: 'medium' }),
    rule('limit_acid', 'note', 'MIL-STD-870 / MIL-STD-1504', { certainty: 'medium' }),
    rule('impregnate_before_finish', 'note', 'MIL-STD-276', { certainty: 'low' }),
    rule('not_to_be_plated', 'blocker', 'QQ-P-416F 3.2.1, on a secondary page', { confidence: 'read' }),
    rule('special_cleaning', 'note', 'QQ-P-416F 3.2.3, on a secondary page', { confidence: 'read' }),
    rule('fluorescent_before_visible', 'blocker', 'ASTM E1417/E1417M'),
    rule('age_after_solution', 'blocker', 'AMS 2770'),
    rule(
      'strength_not_stated',
      'warning',
      'Needed to read the embrittlement rules of the called specification',
      { confidence: 'computed' },
    ),
    rule('revision_decides_bake', 'warning', 'QQ-P-416E/F: 3 h became 23 h', { certainty: 'medium' }),
    rule('no_bake_rule_known', 'warning', 'ASTM B850-98: from 1000 MPa a bake is usual', {
      confidence: 'read',
    }),
  ],
};
