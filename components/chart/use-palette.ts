'use client';
import { useSyncExternalStore } from 'react';

/** The design's custom properties that a canvas needs as plain colours. */
const NAMES = [
  'paper',
  'rule',
  'ink',
  'quiet',
  'proved-wash',
  'proved-ink',
  'dispatched-wash',
  'dispatched-ink',
  'atproc-ink',
  'settled-ink',
  'returned-ink',
  'held-ink',
  'mono',
  'cond',
] as const;
export type Palette = Readonly<Record<(typeof NAMES)[number], string>>;

/** The colours and type in force, by day or by night; null before there is a browser. */
export function usePalette(): Palette | null {
  const joined = useSyncExternalStore(subscribed, read, () => '');
  if (joined === '') return null;
  const values = joined.split('\n');
  return Object.fromEntries(NAMES.map((name, at) => [name, values[at] ?? ''])) as Palette;
}

/** One string, so that the same colours are the same value. */
function read(): string {
  const style = getComputedStyle(document.body);
  return NAMES.map((name) => style.getPropertyValue(`--${name}`).trim()).join('\n');
}

/** Night is a class of the body or a wish of the device. */
function subscribed(changed: () => void): () => void {
  const observer = new MutationObserver(changed);
  observer.observe(document.body, { attributeFilter: ['class'] });
  const device = matchMedia('(prefers-color-scheme: dark)');
  device.addEventListener('change', changed);
  return () => {
    observer.disconnect();
    device.removeEventListener('change', changed);
  };
}
