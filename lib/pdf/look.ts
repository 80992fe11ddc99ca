import { StyleSheet } from '@react-pdf/renderer';

import { COND, MONO, SANS } from './fonts';

/** Black on white carries everything; colour stands only in the tag's eye. */
export const INK = '#1E2326';
export const QUIET = '#565C60';
export const FAINT = '#6B675C';
export const RULE = '#D8D2C4';
export const LINE = '#7D7768';

/** 12 mm, which every office printer can print up to. */
export const MARGIN = 34;

/** Text on paper is 8.5 pt and more, captions 7. */
export const type = StyleSheet.create({
  text: { fontFamily: SANS, fontSize: 8.6, lineHeight: 1.3, color: INK },
  quiet: { fontFamily: SANS, fontSize: 8.6, lineHeight: 1.3, color: QUIET },
  strong: { fontFamily: SANS, fontWeight: 600, fontSize: 8.6, lineHeight: 1.3, color: INK },
  caption: { fontFamily: COND, fontSize: 7.4, lineHeight: 1.2, color: FAINT },
  section: { fontFamily: COND, fontWeight: 600, fontSize: 10.6, lineHeight: 1.25, color: INK },
  label: { fontFamily: COND, fontWeight: 600, fontSize: 9, lineHeight: 1.2, color: INK },
  figure: { fontFamily: MONO, fontSize: 8.4, lineHeight: 1.3, color: INK },
  strongFigure: { fontFamily: MONO, fontWeight: 600, fontSize: 8.4, lineHeight: 1.3, color: INK },
});
