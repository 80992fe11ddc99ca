import type { OrderItem } from '@/lib/trade/ordering/order-item';

/** What must be proved states it on the order as well: a limit for hardness is the hardness to accept. */
const STATED_BY: readonly (readonly [OrderItem, RegExp])[] = [
  ['hardness_or_conductivity', /hardness|conductiv/i],
  ['hardness_or_strength', /hardness|tensile|strength/i],
  ['coating_thickness', /thickness|coating weight/i],
  ['embrittlement_bake', /\bbak(?:e|ed|ing)\b|embrittlement/i],
  ['bake_start', /\bbake start/i],
  ['stress_relief', /stress relie/i],
  ['corrosion_hours', /salt spray|corrosion/i],
  ['sampling_plan', /\bsampl/i],
  ['sensitivity', /sensitiv/i],
  ['acceptance_criteria', /\bresult|indications|acceptance/i],
  ['personnel_standard', /\binspector/i],
  ['intensity', /intensity/i],
  ['coverage', /coverage/i],
];

/** Items of the ordering information that requirements state by their names. */
export const statedByRequirements = (characteristics: readonly string[]): OrderItem[] =>
  STATED_BY.filter(([, names]) => characteristics.some((one) => names.test(one))).map(([item]) => item);
