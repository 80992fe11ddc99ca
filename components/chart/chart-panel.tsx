'use client';
import { useEffect, useEffectEvent, useRef } from 'react';
import uPlot from 'uplot';

import 'uplot/dist/uPlot.min.css';

import type { ChartDrawing } from '@/lib/evidence/chart/drawing-of';
import type { LineLook } from '@/lib/evidence/chart/line-look';
import type { Reduced } from '@/lib/evidence/chart/reduced';
import type { Span } from '@/lib/evidence/chart/spans';
import { degreeTicks, timeTicks, timeTickWords } from '@/lib/evidence/chart/ticks';

import { paintGround, paintMarks } from './paint';
import type { Palette } from './use-palette';

interface ChartPanelProps {
  drawing: ChartDrawing;
  /** What is in view, already reduced to it. */
  points: Reduced;
  time: Span;
  degrees: Span;
  looks: readonly LineLook[];
  palette: Palette;
  height: number;
  /** Where the reading is taken, null where nowhere. */
  at: number | null;
  /** Whether the numbers of the events and the soak's length stand over it, and whether the times under it. */
  marks: boolean;
  times: boolean;
  onZoom: (to: Span | null) => void;
  onPoint: (at: number | null) => void;
}

/** One canvas over the time in view. It is made once for its colours and lines; data and view are put into it. */
export function ChartPanel(props: ChartPanelProps) {
  const { drawing, points, time, degrees, looks, palette, height, at, marks, times } = props;
  const host = useRef<HTMLDivElement>(null);
  const plot = useRef<uPlot | null>(null);
  const zoom = useEffectEvent((to: Span | null) => props.onZoom(to));
  const point = useEffectEvent((to: number | null) => props.onPoint(to));

  useEffect(() => {
    const element = host.current;
    if (!element) return;
    const made = new uPlot(
      optionsOf({ drawing, looks, palette, marks, times, height, width: element.clientWidth, zoom }),
      [[], ...drawing.channels.map(() => [])],
      element,
    );
    plot.current = made;
    // Only the mouse itself: new data and a new view move the readings under it, which is no pointing.
    made.over.addEventListener('mousemove', ({ offsetX }) => point(made.posToVal(offsetX, 'x')));
    made.over.addEventListener('mouseleave', () => point(null));
    const observer = new ResizeObserver(() => made.setSize({ width: element.clientWidth, height }));
    observer.observe(element);
    return () => {
      observer.disconnect();
      made.destroy();
      plot.current = null;
    };
  }, [drawing, looks, palette, marks, times, height]);

  useEffect(() => {
    const made = plot.current;
    if (!made) return;
    made.batch(() => {
      made.setData([[...points.seconds], ...points.channels.map((values) => [...values])], false);
      made.setScale('x', { min: time.from, max: time.to });
      made.setScale('y', { min: degrees.from, max: degrees.to });
    });
  }, [points, time, degrees, drawing, looks, palette, marks, times, height]);

  useEffect(() => {
    const made = plot.current;
    if (!made) return;
    made.setCursor({ left: at === null ? -10 : made.valToPos(at, 'x'), top: at === null ? -10 : 0 }, false);
  }, [at, points, time]);

  return <div ref={host} className="w-full" />;
}

interface Making {
  drawing: ChartDrawing;
  looks: readonly LineLook[];
  palette: Palette;
  marks: boolean;
  times: boolean;
  height: number;
  width: number;
  zoom: (to: Span | null) => void;
}

const AXIS_WIDTH = 48;

function optionsOf({ drawing, looks, palette, marks, times, height, width, zoom }: Making): uPlot.Options {
  const axis = {
    stroke: palette.quiet,
    font: `11px ${palette.mono}`,
    ticks: { stroke: palette.ink, size: 5, width: 1 },
  };
  return {
    width,
    height,
    padding: [marks ? 30 : 8, 12, times ? 0 : 8, 0],
    legend: { show: false },
    scales: { x: { time: false, auto: false }, y: { auto: false } },
    cursor: {
      drag: { x: true, y: false, setScale: false },
      points: { show: false },
      y: false,
      bind: { dblclick: () => () => (zoom(null), null) },
    },
    axes: [
      {
        ...axis,
        show: times,
        size: 30,
        grid: { show: false },
        splits: (_, __, from, to) => timeTicks(from, to, width / 110, drawing.counts).map((tick) => tick.at),
        values: (_, splits) => splits.map((at) => timeTickWords(at, drawing.counts)),
      },
      {
        ...axis,
        size: AXIS_WIDTH,
        grid: { stroke: palette.rule, width: 1 },
        splits: (_, __, from, to) => degreeTicks(from, to, height / 50).map((tick) => tick.at),
        values: (_, splits) => splits.map(String),
      },
    ],
    series: [
      {},
      ...looks.map(({ ink, width: lineWidth, dash }) => ({
        stroke: palette[ink],
        width: lineWidth,
        dash: [...dash],
        points: { show: false },
        spanGaps: false,
      })),
    ],
    hooks: {
      drawClear: [(made) => paintGround(made, drawing, palette)],
      draw: [(made) => paintMarks(made, drawing, palette, marks)],
      setSelect: [
        (made) => {
          const { left, width: wide } = made.select;
          if (wide < 4) return;
          zoom({ from: made.posToVal(left, 'x'), to: made.posToVal(left + wide, 'x') });
          made.setSelect({ left: 0, top: 0, width: 0, height: 0 }, false);
        },
      ],
    },
  };
}
