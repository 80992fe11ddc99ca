'use client';

import { useEffect, useRef, useState } from 'react';
import { call } from '@/lib/api/client';
import { getFile, type FileView } from '@/lib/files/contract';
import { NotSent, sendFile, type Destination } from './send-file';

export interface Upload {
  key: number;
  name: string;
  size: number;
  state: 'waiting' | 'sending' | 'checking' | 'arrived' | 'refused';
  /** Bytes that have left. */
  sent: number;
  refusal: NotSent | null;
  file: FileView | null;
}

interface Running {
  source: File;
  stop: AbortController;
}

/**
 * Sends files one after the other, so that on a thin line at least the first one is through.
 *
 * @param onArrived each file that counts from now on.
 */
export function useUploads(to: Destination, onArrived: (file: FileView) => void) {
  const [uploads, setUploads] = useState<readonly Upload[]>([]);
  const running = useRef(new Map<number, Running>());
  const lastKey = useRef(0);
  const line = useRef<Promise<void>>(Promise.resolve());

  // Whoever leaves the page leaves the upload; the same file may be sent again later and goes to the same place.
  useEffect(() => {
    const all = running.current;
    return () => all.forEach(({ stop }) => stop.abort());
  }, []);

  const change = (key: number, with_: Partial<Upload>) =>
    setUploads((all) => all.map((one) => (one.key === key ? { ...one, ...with_ } : one)));
  const arrive = (key: number, file: FileView) => {
    running.current.delete(key);
    change(key, { state: 'arrived', file, refusal: null });
    onArrived(file);
  };

  const send = async (key: number) => {
    const job = running.current.get(key);
    if (!job || job.stop.signal.aborted) return;
    change(key, { state: 'sending', sent: 0, refusal: null });
    try {
      const watch = {
        signal: job.stop.signal,
        onSent: (sent: number) => change(key, { sent }),
        onChecking: () => change(key, { state: 'checking' }),
      };
      arrive(key, await sendFile(job.source, to, watch));
    } catch (error) {
      if (job.stop.signal.aborted) return;
      change(key, {
        state: 'refused',
        refusal:
          error instanceof NotSent ? error : new NotSent('This file did not get through. Try again.', true),
      });
    }
  };
  const queue = (key: number) => {
    line.current = line.current.then(() => send(key));
  };

  return {
    uploads,
    add(files: readonly File[]) {
      for (const source of files) {
        const key = (lastKey.current += 1);
        running.current.set(key, { source, stop: new AbortController() });
        setUploads((all) => [
          ...all,
          { key, name: source.name, size: source.size, state: 'waiting', sent: 0, refusal: null, file: null },
        ]);
        queue(key);
      }
    },
    again(key: number) {
      change(key, { state: 'waiting', refusal: null });
      queue(key);
    },
    async takeSame(key: number, fileId: string) {
      arrive(key, await call(getFile, { fileId }));
    },
    /** Stops it where it is under way, and takes it off the list. */
    remove(key: number) {
      running.current.get(key)?.stop.abort();
      running.current.delete(key);
      setUploads((all) => all.filter((one) => one.key !== key));
    },
  };
}
