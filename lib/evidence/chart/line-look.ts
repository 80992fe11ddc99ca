import type { DrawnChannel } from './drawing-of';

/** How a line is drawn, so that each can be told from the others without colour. */
export interface LineLook {
  /** Names of the design's colours; each has a day and a night value. */
  readonly ink:
    'ink' | 'dispatched-ink' | 'atproc-ink' | 'settled-ink' | 'returned-ink' | 'quiet' | 'held-ink';
  readonly width: number;
  readonly dash: readonly number[];
}

const LOOKS: readonly LineLook[] = [
  { ink: 'ink', width: 1.5, dash: [] },
  { ink: 'settled-ink', width: 1.5, dash: [7, 3] },
  { ink: 'atproc-ink', width: 1.5, dash: [2, 3] },
  { ink: 'returned-ink', width: 1.5, dash: [9, 3, 2, 3] },
  { ink: 'settled-ink', width: 1.5, dash: [12, 4] },
  { ink: 'atproc-ink', width: 1.5, dash: [5, 2] },
  { ink: 'returned-ink', width: 1.5, dash: [3, 2, 3, 6] },
];
const DECISIVE: LineLook = { ink: 'held-ink', width: 2.2, dash: [] };
const SET_POINT: LineLook = { ink: 'quiet', width: 1, dash: [1, 4] };
const LEFT_OUT: LineLook = { ink: 'quiet', width: 1, dash: [4, 4] };

/** The looks of all lines; the one that decided is red oxide and heavier, one that is not counted thin and broken. */
export function lineLooks(channels: readonly Omit<DrawnChannel, 'values'>[]): readonly LineLook[] {
  let next = 0;
  return channels.map(({ role, excluded, matters }) => {
    if (role === 'set_point') return SET_POINT;
    if (excluded !== null) return LEFT_OUT;
    if (matters) return DECISIVE;
    return LOOKS[next++ % LOOKS.length] ?? SET_POINT;
  });
}
