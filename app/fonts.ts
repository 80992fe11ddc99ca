import localFont from 'next/font/local';

/**
 * The extended letters lie in files of their own, fetched only when a name needs one. They stand first in the family,
 * because the fallback that follows the main file would otherwise draw them.
 */
const sans = localFont({
  variable: '--font-barlow',
  display: 'swap',
  src: [
    { path: '../public/fonts/barlow-latin-400-normal.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/barlow-latin-500-normal.woff2', weight: '500', style: 'normal' },
    { path: '../public/fonts/barlow-latin-600-normal.woff2', weight: '600', style: 'normal' },
  ],
});

const sansExtended = localFont({
  variable: '--font-barlow-ext',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA,U+1E00-1E9F,U+20A0-20AB,U+20AD-20C0' }],
  src: [
    { path: '../public/fonts/barlow-latin-ext-400-normal.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/barlow-latin-ext-500-normal.woff2', weight: '500', style: 'normal' },
    { path: '../public/fonts/barlow-latin-ext-600-normal.woff2', weight: '600', style: 'normal' },
  ],
});

const cond = localFont({
  variable: '--font-barlow-cond',
  display: 'swap',
  src: [
    { path: '../public/fonts/barlow-semi-condensed-latin-400-normal.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/barlow-semi-condensed-latin-500-normal.woff2', weight: '500', style: 'normal' },
    { path: '../public/fonts/barlow-semi-condensed-latin-600-normal.woff2', weight: '600', style: 'normal' },
    { path: '../public/fonts/barlow-semi-condensed-latin-700-normal.woff2', weight: '700', style: 'normal' },
  ],
});

const condExtended = localFont({
  variable: '--font-barlow-cond-ext',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA,U+1E00-1E9F,U+20A0-20AB,U+20AD-20C0' }],
  src: [
    {
      path: '../public/fonts/barlow-semi-condensed-latin-ext-400-normal.woff2',
      weight: '400',
      style: 'normal',
    },
    {
      path: '../public/fonts/barlow-semi-condensed-latin-ext-500-normal.woff2',
      weight: '500',
      style: 'normal',
    },
    {
      path: '../public/fonts/barlow-semi-condensed-latin-ext-600-normal.woff2',
      weight: '600',
      style: 'normal',
    },
    {
      path: '../public/fonts/barlow-semi-condensed-latin-ext-700-normal.woff2',
      weight: '700',
      style: 'normal',
    },
  ],
});

const mono = localFont({
  variable: '--font-spline-mono',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  src: [
    { path: '../public/fonts/spline-sans-mono-latin-400-normal.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/spline-sans-mono-latin-500-normal.woff2', weight: '500', style: 'normal' },
    { path: '../public/fonts/spline-sans-mono-latin-600-normal.woff2', weight: '600', style: 'normal' },
  ],
});

export const fontVariables = [sans, sansExtended, cond, condExtended, mono]
  .map((font) => font.variable)
  .join(' ');
