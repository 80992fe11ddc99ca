import type { HardnessScale } from './hardness-table';

interface Hardness {
  readonly value: number;
  readonly scale: HardnessScale;
}

/** A measured hardness with what it converts to in brackets, as ASTM E140 wants it reported: `353 HBW (38 HRC)`. */
export const writeConverted = (measured: Hardness, converted: Hardness): string =>
  `${write(measured)} (${write(converted)})`;

/** Rockwell is read to half a point at best; Vickers and Brinell numbers are whole. */
const write = ({ value, scale }: Hardness): string =>
  `${scale.startsWith('HR') ? Math.round(value * 10) / 10 : Math.round(value)} ${scale}`;
