'use client';
import { useSyncExternalStore } from 'react';

const SECOND_MS = 1000;
const MINUTE_MS = 60_000;

/**
 * The moment it is, again with every second; with every minute for who asked for less motion. Rounded up, so that a
 * time that runs out is never shown longer than it is. Null while the server draws the page.
 */
export function useNow(): Date | null {
  const at = useSyncExternalStore(everySecond, read, () => null);
  return at === null ? null : new Date(at);
}

function everySecond(told: () => void): () => void {
  const timer = setInterval(told, SECOND_MS);
  return () => clearInterval(timer);
}

function read(): number {
  const step = window.matchMedia('(prefers-reduced-motion: reduce)').matches ? MINUTE_MS : SECOND_MS;
  return Math.ceil(Date.now() / step) * step;
}
