'use client';
import { useState } from 'react';

import type { Span } from '@/lib/evidence/chart/spans';

const STEP = 0.5;

/** The time in view, never outside of the chart and never nothing. */
export function useZoom(whole: Span, shortest: number) {
  const [view, setView] = useState<Span>(whole);
  const zoomTo = (to: Span | null) => setView(to === null ? whole : within(to, whole, shortest));
  return {
    view,
    zoomTo,
    /** Nearer or farther by half, around a time. */
    zoomAround: (at: number, nearer: boolean) => {
      const factor = nearer ? STEP : 1 / STEP;
      zoomTo({ from: at - (at - view.from) * factor, to: at + (view.to - at) * factor });
    },
    /** Moves the view so far that a time is in it. */
    bringIn: (at: number) => {
      if (at >= view.from && at <= view.to) return;
      const half = (view.to - view.from) / 2;
      zoomTo({ from: at - half, to: at + half });
    },
  };
}

function within({ from, to }: Span, whole: Span, shortest: number): Span {
  const length = Math.min(whole.to - whole.from, Math.max(shortest, to - from));
  const start = Math.min(Math.max(whole.from, (from + to - length) / 2), whole.to - length);
  return { from: start, to: start + length };
}
