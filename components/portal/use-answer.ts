'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';

import { ApiError, call } from '@/lib/api/client';
import type { Declaration, InputOf, OutputOf } from '@/lib/api/endpoint';
import { getPortalBatch, listPortalMessages } from '@/lib/portal/contract';
import { useKept } from './use-kept';

interface Waiting<Input> {
  input: Input;
  /** The same for every attempt, so that an answer which did arrive is not given twice. */
  key: string;
}

/**
 * An answer that survives a lost network: it is kept on this device and sent when the network is back, even after the
 * page was closed. Anything the server refuses is told and no longer kept.
 */
export function useAnswer<D extends Declaration>(
  declaration: D,
  name: string,
  onSent?: (result: OutputOf<D>) => void,
) {
  const cache = useQueryClient();
  const [waiting, keep] = useKept<Waiting<InputOf<D>>>(`${declaration.id}:${name}`);
  const [refusal, setRefusal] = useState<ApiError | null>(null);
  const [sending, setSending] = useState(false);
  const busy = useRef(false);
  const tell = useRef(onSent);
  useEffect(() => {
    tell.current = onSent;
  });

  const send = useCallback(
    async (answer: Waiting<InputOf<D>>) => {
      if (busy.current) return;
      busy.current = true;
      setSending(true);
      try {
        const result = await call(declaration, answer.input, { key: answer.key });
        keep(null);
        setRefusal(null);
        await Promise.all(
          [getPortalBatch, listPortalMessages].map((read) =>
            cache.invalidateQueries({ queryKey: [read.id] }),
          ),
        );
        tell.current?.(result);
      } catch (error) {
        if (!(error instanceof ApiError)) throw error;
        if (passes(error)) keep(answer);
        else {
          keep(null);
          setRefusal(error);
          // What was refused is mostly what somebody else has done meanwhile.
          await cache.invalidateQueries({ queryKey: [getPortalBatch.id] });
        }
      } finally {
        busy.current = false;
        setSending(false);
      }
    },
    [cache, declaration, keep],
  );

  const unsent = useRef(waiting);
  useEffect(() => {
    unsent.current = waiting;
  });
  useEffect(() => {
    const again = () => {
      if (unsent.current) void send(unsent.current);
    };
    again();
    window.addEventListener('online', again);
    const every = setInterval(again, TRY_AGAIN_MS);
    return () => {
      window.removeEventListener('online', again);
      clearInterval(every);
    };
  }, [send]);

  return {
    give: (input: InputOf<D>) => send({ input, key: crypto.randomUUID() }),
    sending,
    /** Kept here because there was no network. */
    waiting: waiting !== null,
    refusal,
    forget: () => keep(null),
  };
}

const TRY_AGAIN_MS = 20_000;

const passes = ({ problem }: ApiError): boolean => problem.status === 0 || problem.status === 503;
