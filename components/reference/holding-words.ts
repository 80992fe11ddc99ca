import type { HoldingRefusal } from '@/lib/trade/heat-treat/holding-clock';

const REFUSALS: Record<HoldingRefusal, string> = {
  alloy_not_in_table: 'The tables have no holding time for this alloy.',
  not_cold_enough:
    'The store is warmer than the table goes. It counts as room temperature: use a colder one.',
  times_out_of_order: 'The times are out of order: quench, into the cold, out of the cold.',
  room_time_exceeded: 'It lay too long at room temperature. It is treated again, or aged as it is.',
  cold_time_exceeded: 'It lay too long in the cold. It is treated again, or aged as it is.',
};

export const holdingRefusal = (reason: HoldingRefusal): string => REFUSALS[reason];
