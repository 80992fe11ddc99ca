'use client';
import { useCallback, useMemo, useSyncExternalStore } from 'react';

/** How long something typed and not sent stays on a phone. */
export const KEPT_DAYS = 3;

const PREFIX = 'lw-kept:';
const listeners = new Set<() => void>();

/** What a person typed, kept on this device until it is sent or three days have gone. Null where nothing is kept. */
export function useKept<Value>(name: string): [Value | null, (value: Value | null) => void] {
  const key = PREFIX + name;
  const stored = useSyncExternalStore(
    subscribe,
    () => read(key),
    () => null,
  );
  const value = useMemo(() => valueOf<Value>(stored), [stored]);
  const keep = useCallback((next: Value | null) => write(key, next), [key]);
  return [value, keep];
}

interface Kept {
  at: number;
  value: unknown;
}

function valueOf<Value>(stored: string | null): Value | null {
  if (stored === null) return null;
  try {
    return (JSON.parse(stored) as Kept).value as Value;
  } catch {
    return null;
  }
}

function read(key: string): string | null {
  // A browser that keeps nothing (private windows do) is no reason for the page to fail.
  try {
    const stored = window.localStorage.getItem(key);
    if (stored === null) return null;
    return Date.now() - (JSON.parse(stored) as Kept).at > KEPT_DAYS * 86_400_000 ? null : stored;
  } catch {
    return null;
  }
}

function write(key: string, value: unknown): void {
  try {
    if (value === null) window.localStorage.removeItem(key);
    else window.localStorage.setItem(key, JSON.stringify({ at: Date.now(), value } satisfies Kept));
  } catch {
    // Kept nowhere then; what is typed still stands in its field.
  }
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('storage', listener);
  };
}
