import type { Process } from '@/lib/trade/process';

/**
 * What stands on every traveller. Cautions of a process come with the trade library and its sources; none is made up
 * here.
 */
export function cautionsOf(_process: Process): string[] {
  return [
    'Only the work asked here, to the specification at the revision named.',
    'Keep the lots apart; each line comes back with its lot number.',
    'If anything here and the order differ, stop and call.',
  ];
}
