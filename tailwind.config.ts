import type { Config } from 'tailwindcss';

/** Sizes are drawn in pixels and set in rem, so that a person's own text size carries the whole form with it. */
const rem = (px: number) => `${px / 16}rem`;

type Weight = '400' | '600' | '700';
const type = (size: number, line: number, fontWeight: Weight = '400', letterSpacing = '0'): TypeSize => [
  rem(size),
  { lineHeight: rem(line), letterSpacing, fontWeight },
];
type TypeSize = [string, { lineHeight: string; letterSpacing: string; fontWeight: string }];

/** Each colour is a custom property, so night needs no second class. */
const surface = (name: string) => `var(--${name})`;
const stage = (name: string) => ({
  DEFAULT: `var(--${name})`,
  ink: `var(--${name}-ink)`,
  wash: `var(--${name}-wash)`,
});

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      inherit: 'inherit',
      white: '#FFFFFF',
      paper: surface('paper'),
      bench: surface('bench'),
      deep: surface('deep'),
      rule: surface('rule'),
      line: surface('line'),
      ink: surface('ink'),
      quiet: surface('quiet'),
      faint: surface('faint'),
      focus: surface('focus'),
      halo: surface('halo'),
      field: surface('field'),
      building: stage('building'),
      dispatched: stage('dispatched'),
      atproc: stage('atproc'),
      returned: stage('returned'),
      proved: stage('proved'),
      settled: stage('settled'),
      stocked: stage('stocked'),
      held: stage('held'),
    },
    fontFamily: { sans: ['var(--sans)'], cond: ['var(--cond)'], mono: ['var(--mono)'] },
    fontSize: {
      page: type(30, 32, '700', '-0.015em'),
      thing: type(25, 32, '600', '-0.02em'),
      section: type(18, 24, '600', '-0.005em'),
      sub: type(15, 20, '600'),
      body: type(14.5, 20),
      row: type(14.5, 18),
      phone: type(15, 22),
      second: type(14, 18),
      figure: type(13.5, 18, '400', '-0.01em'),
      word: type(14.5, 16, '600'),
      string: type(13.5, 16),
      caption: type(13, 15, '400', '0.01em'),
      source: type(12.5, 16),
      axis: type(11, 14),
    },
    borderRadius: { none: '0' },
    boxShadow: {},
    dropShadow: {},
    extend: {
      spacing: { gutter: rem(36), page: rem(24) },
      borderWidth: { heavy: '1.5px' },
      screens: { wide: '90rem' },
      maxWidth: { table: rem(1680), prose: rem(620) },
    },
  },
};

export default config;
