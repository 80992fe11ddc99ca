'use client';
import { useId, useMemo, useState, type KeyboardEvent } from 'react';

import { Numbers } from '@/components/plots/numbers';
import type { ChartDrawing } from '@/lib/evidence/chart/drawing-of';
import { extremesOf } from '@/lib/evidence/chart/extremes';
import { lineLooks } from '@/lib/evidence/chart/line-look';
import { chartPaths } from '@/lib/evidence/chart/paths';
import { reduced, rowAt } from '@/lib/evidence/chart/reduced';
import { bandSpan, timeSpan, wholeSpan } from '@/lib/evidence/chart/spans';
import { timeTickWords } from '@/lib/evidence/chart/ticks';

import { ChartControls } from './chart-controls';
import { ChartEvents } from './chart-events';
import { ChartLegend } from './chart-legend';
import { ChartPanel } from './chart-panel';
import { ChartPicture } from './chart-picture';
import { useZoom } from './use-zoom';
import { usePalette } from './use-palette';

/** As many columns as a wide screen has room for; a narrower one draws some of them on each other. */
const COLUMNS = 1200;
/** One press of an arrow is this share of what is in view. */
const STEPS = 300;

/** A furnace chart: the band enlarged over the whole run, with soak, events and readings, by mouse or by keyboard. */
export function FurnaceChart({ drawing }: { drawing: ChartDrawing }) {
  const { seconds, channels, events, counts, unit } = drawing;
  const palette = usePalette();
  const looks = useMemo(() => lineLooks(channels), [channels]);
  const extremes = useMemo(() => channels.map(({ values }) => extremesOf(values)), [channels]);
  const whole = useMemo(() => timeSpan(drawing), [drawing]);
  const spans = useMemo(() => ({ detail: bandSpan(drawing), whole: wholeSpan(drawing) }), [drawing]);
  const paths = useMemo(() => chartPaths(drawing), [drawing]);
  const { view, zoomTo, zoomAround, bringIn } = useZoom(
    whole,
    (whole.to - whole.from) / Math.max(1, seconds.length / 5),
  );
  const points = useMemo(
    () => reduced(seconds, extremes, { ...view, columns: COLUMNS }),
    [seconds, extremes, view],
  );
  const [at, setAt] = useState<number | null>(null);
  const [chosen, setChosen] = useState<number | null>(null);
  /** Only what the keyboard does is read aloud: a mouse would never let it finish. */
  const [spoken, setSpoken] = useState('');
  const keysId = useId();

  const row = at === null ? null : Math.min(seconds.length - 1, rowAt(seconds, at));
  const pointAt = (to: number) => {
    const here = Math.min(whole.to, Math.max(whole.from, to));
    setAt(here);
    bringIn(here);
    setSpoken(readingsAt(drawing, Math.min(seconds.length - 1, rowAt(seconds, here))));
  };
  const choose = (number: number) => {
    const event = events.find((one) => one.number === number);
    if (!event) return;
    setChosen(number);
    pointAt(event.from);
    setSpoken(event.says);
  };
  const step = (by: 1 | -1) => choose((chosen ?? (by === 1 ? 0 : events.length + 1)) + by);
  const middle = (view.from + view.to) / 2;
  const zoom = (nearer: boolean) => zoomAround(at ?? middle, nearer);
  const press = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    // A stride is a share of the view, but never less than a row.
    const stride =
      Math.max((view.to - view.from) / STEPS, (whole.to - whole.from) / seconds.length) *
      (event.shiftKey ? 10 : 1);
    const keys: Record<string, () => void> = {
      ArrowRight: () => pointAt((at ?? middle) + stride),
      ArrowLeft: () => pointAt((at ?? middle) - stride),
      Home: () => pointAt(whole.from),
      End: () => pointAt(whole.to),
      '+': () => zoom(true),
      '=': () => zoom(true),
      '-': () => zoom(false),
      '0': () => zoomTo(null),
      ']': () => step(1),
      '[': () => step(-1),
    };
    const act = keys[event.key];
    if (!act) return;
    event.preventDefault();
    act();
  };

  const common = { drawing, points, looks, at, time: view, onZoom: zoomTo, onPoint: setAt };
  return (
    <figure>
      <div
        role="group"
        tabIndex={0}
        aria-label="Furnace chart"
        aria-describedby={keysId}
        onKeyDown={press}
        className="print:hidden"
      >
        {palette && (
          <div role="img" aria-label={drawing.says}>
            <ChartPanel
              {...common}
              palette={palette}
              degrees={spans.detail}
              height={340}
              marks
              times={false}
            />
            <ChartPanel
              {...common}
              palette={palette}
              degrees={spans.whole}
              height={200}
              marks={false}
              times
            />
          </div>
        )}
        <p id={keysId} className="flex justify-between pt-1 text-source text-faint">
          <span className="touch:hidden">Drag over a time to see it nearer; the arrows move the cursor.</span>
          <span className="num">{row === null ? '' : timeTickWords(seconds[row] ?? 0, counts)}</span>
        </p>
        <p role="status" className="sr-only">
          {spoken}
        </p>
      </div>
      <ChartControls
        onNearer={() => zoom(true)}
        onFurther={() => zoom(false)}
        onWhole={() => zoomTo(null)}
        onEvent={step}
      />
      <ChartPicture paths={paths} className={palette ? 'hidden print:block' : ''} />
      <ChartLegend channels={channels} looks={looks} unit={unit} row={row} />
      <ChartEvents events={events} counts={counts} chosen={chosen} onChoose={choose} />
      <Numbers
        label="The thermocouples as a table"
        heads={['Name', 'Role', 'Counted', 'In the band']}
        rows={channels.map(({ name, role, excluded, says }) => [
          name,
          role.replace('_', ' '),
          excluded === null ? 'yes' : `no, ${excluded.replace('_', ' ')}`,
          says.replace('in the band ', ''),
        ])}
      />
    </figure>
  );
}

function readingsAt({ seconds, channels, counts, unit }: ChartDrawing, row: number): string {
  const readings = channels.map(({ name, values }) => {
    const value = values[row] ?? Number.NaN;
    return `${name} ${Number.isFinite(value) ? value.toFixed(1) : 'no reading'}`;
  });
  return `${timeTickWords(seconds[row] ?? 0, counts)}: ${readings.join(', ')}, in °${unit}.`;
}
