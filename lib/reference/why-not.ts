import type { WhyNot } from '@/lib/trade/tables/temper-transitions';

/** Why a condition cannot be made outside a mill, in a sentence; the same on the bench, in the editor and in the checks. */
export const WHY_NOT: Record<WhyNot, string> = {
  needs_mill_cold_work: 'It needs cold work between quench and ageing, which only the mill does.',
  needs_mill_stretch: 'It needs stretching after the quench, which only the mill does.',
  ageing_gives_another_temper: 'Ageing makes another temper of it.',
  ageing_cannot_be_undone: 'What ageing did can not be taken back without solution treating again.',
  needs_re_solution: 'It has to be solution treated again first.',
  never_stable_at_room_temperature: 'This alloy never becomes stable at room temperature.',
  not_hardened_by_ageing: 'This alloy is not hardened by ageing.',
};
