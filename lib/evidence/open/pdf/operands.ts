import type { Box } from '../../page';
import type { Colour } from './drawn';
import type { Matrix } from './matrix';

/** What an operator of a page may be given, read as what it should be. A file may give anything. */
type Numbers = readonly number[];
export const isNumbers = (value: unknown): value is Numbers =>
  value instanceof Float32Array || (Array.isArray(value) && value.every((n) => typeof n === 'number'));
export const toMatrix = (value: unknown): Matrix | null =>
  isNumbers(value) && value.length >= 6 ? (Array.from(value).slice(0, 6) as unknown as Matrix) : null;
export const toBox = (value: unknown): Box | null =>
  isNumbers(value) && value.length >= 4 ? (Array.from(value).slice(0, 4) as unknown as Box) : null;
export const toNumber = (value: unknown): number =>
  typeof value === 'number' && Number.isFinite(value) ? value : 0;

export function toColour(value: unknown): Colour {
  const hex = typeof value === 'string' ? /^#([0-9a-f]{6})$/i.exec(value)?.[1] : undefined;
  if (!hex) return null;
  const n = parseInt(hex, 16);
  return [n >> 16, (n >> 8) & 255, n & 255];
}

export const nameIn = (value: unknown): string | null => (typeof value === 'string' ? value : null);
export const sizeOf = (value: unknown) => {
  const { width, height } = (value ?? {}) as { width?: unknown; height?: unknown };
  return { pixelsWide: toNumber(width), pixelsHigh: toNumber(height) };
};
