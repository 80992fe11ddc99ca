'use client';
import {
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
  useSuspenseQuery,
  type UseMutationResult,
} from '@tanstack/react-query';
import { useRef } from 'react';

import { ApiError, call } from '@/lib/api/client';
import type { Declaration, InputOf, OutputOf } from '@/lib/api/endpoint';
import { queryKeyOf } from '@/lib/api/query-key';
import { listAudit } from '@/lib/audit/contract';
import { getWaiting } from '@/lib/tideline/contract';

const optionsOf = <D extends Declaration>(declaration: D, input: InputOf<D>) => ({
  queryKey: queryKeyOf(declaration, input as Record<string, unknown>),
  queryFn: ({ signal }: { signal: AbortSignal }) => call(declaration, input, { signal }),
});

/** A read that the page prefetched; keeps itself fresh. */
export function useRead<D extends Declaration>(declaration: D, input: InputOf<D>) {
  return useSuspenseQuery<OutputOf<D>>(optionsOf(declaration, input));
}

/** A read that starts in the browser: search as one types, a detail that opens. */
export function useLazyRead<D extends Declaration>(
  declaration: D,
  input: InputOf<D>,
  options: {
    enabled?: boolean;
    refreshEveryMs?: number;
    /** Looks again only while the last answer says so. */
    refreshWhile?: (data: OutputOf<D>) => boolean;
  } = {},
) {
  const { refreshEveryMs, refreshWhile } = options;
  return useQuery<OutputOf<D>>({
    ...optionsOf(declaration, input),
    enabled: options.enabled ?? true,
    refetchInterval: ({ state: { data } }) =>
      refreshEveryMs === undefined || (data !== undefined && refreshWhile?.(data) === false)
        ? false
        : refreshEveryMs,
  });
}

/** A list that loads further pages by key. The first page is the prefetched one. */
export function usePages<D extends Declaration>(declaration: D, input: InputOf<D>) {
  const cache = useQueryClient();
  const firstKey = queryKeyOf(declaration, input as Record<string, unknown>);
  const first = cache.getQueryState<OutputOf<D> & { next: string | null }>(firstKey);
  return useInfiniteQuery({
    queryKey: [...firstKey, 'pages'],
    ...(first?.data
      ? {
          initialData: { pages: [first.data], pageParams: [null] },
          initialDataUpdatedAt: first.dataUpdatedAt,
        }
      : {}),
    queryFn: ({ pageParam, signal }) =>
      call(
        declaration,
        { ...(input as object), ...(pageParam === null ? {} : { after: pageParam }) } as InputOf<D>,
        { signal },
      ) as Promise<OutputOf<D> & { next: string | null }>,
    initialPageParam: null as string | null,
    getNextPageParam: (page: { next: string | null }) => page.next,
  });
}

/**
 * A write. Afterwards the named reads are fetched again. The same press keeps its key when it is tried again after a
 * lost answer; a new press gets a new one.
 */
export function useWrite<D extends Declaration>(
  declaration: D,
  options: { refreshes?: readonly Declaration[] } = {},
): UseMutationResult<OutputOf<D>, ApiError, InputOf<D>> {
  const cache = useQueryClient();
  const key = useRef('');
  return useMutation<OutputOf<D>, ApiError, InputOf<D>>({
    onMutate: () => {
      key.current = crypto.randomUUID();
    },
    mutationFn: (input) => call(declaration, input, { key: key.current }),
    retry: (count, error) =>
      count < 3 && error instanceof ApiError && [0, 503].includes(error.problem.status),
    retryDelay: (count) => 400 * 2 ** count,
    onSuccess: () => {
      // Every write is recorded and nearly every one changes what waits for somebody; both follow without being waited for.
      void cache.invalidateQueries({ queryKey: [getWaiting.id] });
      void cache.invalidateQueries({ queryKey: [listAudit.id] });
      return Promise.all(
        (options.refreshes ?? []).map((read) => cache.invalidateQueries({ queryKey: [read.id] })),
      );
    },
  });
}
