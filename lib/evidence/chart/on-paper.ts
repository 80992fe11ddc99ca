import type { LineLook } from './line-look';

/** The day's colours of the design, for a chart on paper. */
export const ON_PAPER: Record<LineLook['ink'], string> = {
  ink: '#1E2326',
  'dispatched-ink': '#6F5410',
  'atproc-ink': '#7D4D16',
  'settled-ink': '#3B607D',
  'returned-ink': '#5C3F6D',
  quiet: '#565C60',
  'held-ink': '#8E2F20',
};
/** Lines of the grid, the band and its edges, the soak. */
export const [GRID, BAND, BAND_INK, WINDOW] = ['#D8D2C4', '#DDE7F0', '#26527B', '#F7EDD0'] as const;
