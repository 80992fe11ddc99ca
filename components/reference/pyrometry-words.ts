import type { FurnaceFault, isFurnaceGoodFor } from '@/lib/trade/pyrometry/is-furnace-good-for';

export const FAULTS: Record<FurnaceFault, string> = {
  class_too_loose: 'The furnace is less uniform than the cycle asks.',
  never_surveyed: 'No uniformity survey before that day.',
  survey_failed: 'The last uniformity survey failed.',
  survey_overdue: 'The uniformity survey is overdue.',
  outside_surveyed_range: 'The survey does not cover the temperatures of the cycle.',
  never_accuracy_tested: 'No system accuracy test before that day.',
  accuracy_test_failed: 'The last system accuracy test failed.',
  accuracy_test_overdue: 'The system accuracy test is overdue.',
};

const REFUSALS: Record<Extract<ReturnType<typeof isFurnaceGoodFor>, { ok: false }>['reason'], string> = {
  not_a_date: 'Enter the day of the cycle and of each test.',
  range_reversed: 'A lowest temperature is over its highest. Enter them the other way round.',
  class_not_in_table: 'The tables do not have this furnace class.',
  class_and_type_not_in_table: 'The tables have no intervals for this class with this type of instruments.',
};

export const pyrometryRefusal = (reason: keyof typeof REFUSALS): string => REFUSALS[reason];
