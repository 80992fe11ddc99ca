'use client';
import { useState } from 'react';

const NEAREST = 4;
const FURTHEST = 0.5;
const STEP = 1.25;

/**
 * Which page, how near, which way up. Kept outside the page itself, so that a chart and back again starts anew on purpose.
 *
 * @param given how many pages there are, where that is known before one is drawn.
 */
export function usePaging(given: number | null = null) {
  const [page, setPage] = useState(1);
  const [found, setPages] = useState(1);
  const pages = given ?? found;
  const [zoom, setZoom] = useState(1);
  const [turned, setTurned] = useState(0);
  return {
    page,
    pages,
    zoom,
    turned,
    setPages,
    toPage: (wanted: number) => setPage(Math.min(Math.max(1, wanted), pages)),
    nearer: () => setZoom((now) => Math.min(NEAREST, now * STEP)),
    further: () => setZoom((now) => Math.max(FURTHEST, now / STEP)),
    whole: () => setZoom(1),
    turn: () => setTurned((now) => (now + 90) % 360),
  };
}
export type Paging = ReturnType<typeof usePaging>;
