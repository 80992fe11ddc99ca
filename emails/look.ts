import type { Stage } from '@/lib/batches/stage';

/*
 * Mail programs know no custom properties and no fonts of ours: the tokens of the screens as plain values, by day.
 */
export const COLOURS = {
  paper: '#FAF8F3',
  ink: '#1E2326',
  quiet: '#565C60',
  faint: '#6B675C',
  rule: '#D8D2C4',
  straw: '#D9B44A',
  strawInk: '#6F5410',
  red: '#A23A2A',
} as const;

export const SANS = "Barlow, 'Helvetica Neue', Arial, sans-serif";
export const COND = "'Barlow Semi Condensed', 'Arial Narrow', Arial, sans-serif";
export const MONO = "'Spline Sans Mono', Consolas, Menlo, monospace";

/** The three tones of a stage, its mark as a character that every font has, and its word. */
export const STAGE_LOOK: Record<
  Stage,
  { edge: string; ink: string; wash: string; mark: string; word: string }
> = {
  building: { edge: '#FAF8F3', ink: '#4A5054', wash: '#FAF8F3', mark: '□', word: 'building' },
  dispatched: { edge: '#D9B44A', ink: '#6F5410', wash: '#F7EDD0', mark: '▶', word: 'dispatched' },
  at_processor: { edge: '#A8702E', ink: '#7D4D16', wash: '#F2E4D2', mark: '◆', word: 'at processor' },
  returned: { edge: '#6B4A7D', ink: '#5C3F6D', wash: '#EAE2EE', mark: '◀', word: 'returned' },
  proved: { edge: '#2E5E8C', ink: '#26527B', wash: '#DDE7F0', mark: '●', word: 'proved' },
  settled: { edge: '#7FA3BF', ink: '#3B607D', wash: '#E5EEF4', mark: '=', word: 'settled' },
  stocked: { edge: '#7A868C', ink: '#515C62', wash: '#E7EAEA', mark: '■', word: 'stocked' },
  held: { edge: '#A23A2A', ink: '#8E2F20', wash: '#F6E1DC', mark: '■', word: 'held' },
  cancelled: { edge: '#FAF8F3', ink: '#6B675C', wash: '#FAF8F3', mark: '×', word: 'cancelled' },
};
