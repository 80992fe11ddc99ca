'use client';

import { useSyncExternalStore } from 'react';
import { Edge } from './edge';

interface NoNetworkProps {
  /** The age of what one sees: "08:31 of today". */
  seen?: string;
  /** What is kept here and what waits: "What you count is kept on this tablet and sent later; signing waits." */
  kept?: string;
}

export function NoNetwork({ seen, kept }: NoNetworkProps) {
  const online = useSyncExternalStore(
    subscribe,
    () => navigator.onLine,
    () => true,
  );
  return (
    <div role="status">
      {!online && (
        <Edge level="warn">
          <strong>No network.</strong> {seen && <>You see {seen}.</>}{' '}
          {kept ?? 'Nothing is lost; nothing is sent until it is back.'}
        </Edge>
      )}
    </div>
  );
}

function subscribe(listener: () => void) {
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
}
