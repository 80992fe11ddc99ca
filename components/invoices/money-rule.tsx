'use client';
import { useEffect, useRef, useState } from 'react';

import type { InvoiceDetail } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { acceptedMinor, payableNow } from './compare-rows';
import { moneyScale, placeLabels, type MoneyScale, type RuleLabel } from './money-scale';

const COLOURS = { ink: 'var(--ink)', held: 'var(--held-ink)', proved: 'var(--proved-ink)' };
const ROW = 19;

/** Accepted, ordered, to pay and invoiced on one steel rule, so that what is between them can be read off. */
export function MoneyRule({ invoice }: { invoice: InvoiceDetail }) {
  const { element, width } = useWidth(1016);
  const labels = labelsOf(invoice);
  const over = invoice.differences.filter((one) => one.overMinor > 0 && one.clearance?.choice !== 'accept');
  const scale = moneyScale(labels.map((label) => label.at));
  const place = (at: number) => 1 + ((at - scale.from) / (scale.to - scale.from)) * (width - 2);
  const placed = placeLabels(labels, place, width);
  const top = ROW * Math.max(1, ...placed.map((label) => label.row + 1));
  const line = top + (over.length > 0 ? 30 : 12);
  const payable = payableNow(invoice);
  return (
    <div ref={element} className="min-w-0 pb-2">
      <svg
        width={width}
        height={line + 24}
        viewBox={`0 0 ${width} ${line + 24}`}
        role="img"
        aria-label={labels.map((label) => label.says).join(', ')}
        className="block max-w-full overflow-visible"
      >
        <Ticks scale={scale} place={place} line={line} width={width} />
        {over.length > 0 && (
          <Differences
            parts={over.map((one) => one.overMinor)}
            from={payable}
            to={payable + over.reduce((sum, one) => sum + one.overMinor, 0)}
            place={place}
            line={line}
          />
        )}
        {placed.map((label) => (
          <path
            key={label.says}
            d={`M${label.x} ${label.row * ROW + 20}V${line}`}
            stroke={COLOURS[label.tone]}
            strokeWidth="2"
          />
        ))}
        {/* After all lines and with paper around them, so that no line runs through a word. */}
        {placed.map((label) => (
          <text
            key={label.says}
            x={label.left}
            y={label.row * ROW + 14}
            fontSize="14.5"
            fontWeight="600"
            className="font-cond"
            style={{
              fill: COLOURS[label.tone],
              stroke: 'var(--paper)',
              strokeWidth: 6,
              paintOrder: 'stroke',
            }}
          >
            {label.says}
          </text>
        ))}
      </svg>
    </div>
  );
}

/** One label for each sum; what stands at the same sum is named together. */
function labelsOf(invoice: InvoiceDetail): RuleLabel[] {
  const { order, totalMinor } = invoice;
  const payable = payableNow(invoice);
  const invoiced = totalMinor ?? 0;
  const marks = [
    { at: acceptedMinor(order), name: 'accepted pieces', tone: 'proved' as const },
    { at: order.expectedMinor, name: 'ordered', tone: 'ink' as const },
    { at: payable, name: 'to pay', tone: 'ink' as const },
    { at: invoiced, name: 'invoiced', tone: invoiced > payable ? ('held' as const) : ('ink' as const) },
  ];
  const sums = [...new Set(marks.map((mark) => mark.at))];
  return sums.map((at) => {
    const here = marks.filter((mark) => mark.at === at);
    return {
      at,
      says: `${here.map((mark) => mark.name).join(', ')} ${amountText(at)}`,
      tone: here.find((mark) => mark.tone === 'held')?.tone ?? here[0]?.tone ?? 'ink',
    };
  });
}

interface Drawn {
  place: (at: number) => number;
  line: number;
}

function Ticks({
  scale: { from, to, tick, number },
  place,
  line,
  width,
}: Drawn & { scale: MoneyScale; width: number }) {
  const count = Math.round((to - from) / tick);
  const anchor = (at: number) => {
    if (at === from) return 'start';
    return at === to ? 'end' : 'middle';
  };
  return (
    <>
      {Array.from({ length: count + 1 }, (_, index) => from + index * tick).map((at) => {
        const isLong = Math.abs(at / number - Math.round(at / number)) < 1e-6;
        return (
          <g key={at}>
            <path d={`M${place(at)} ${line}v${isLong ? 8 : 4}`} stroke="var(--line)" />
            {isLong && (
              <text
                x={place(at)}
                y={line + 21}
                fontSize="11"
                textAnchor={anchor(at)}
                className="fill-faint font-mono"
              >
                {(at / 100).toLocaleString('en-US')}
              </text>
            )}
          </g>
        );
      })}
      <path d={`M1 ${line}H${width - 1}`} stroke="var(--ink)" />
    </>
  );
}

const COUNTS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

function Differences({
  parts,
  from,
  to,
  place,
  line,
}: Drawn & { parts: readonly number[]; from: number; to: number }) {
  const [x, end] = [place(from), place(to)];
  const words = `${amountText(to - from)} in ${COUNTS[parts.length] ?? parts.length} ${parts.length === 1 ? 'difference' : 'differences'}`;
  const inside = parts
    .slice(0, -1)
    .map((_, at) => place(from + parts.slice(0, at + 1).reduce((sum, one) => sum + one, 0)));
  return (
    <>
      <rect
        x={x}
        y={line - 12}
        width={Math.max(1, end - x)}
        height="12"
        fill="var(--held-wash)"
        stroke="var(--held-ink)"
      />
      {inside.map((at) => (
        <path key={at} d={`M${at} ${line - 12}v12`} stroke="var(--held-ink)" />
      ))}
      {end - x > words.length * 6.6 && (
        <text
          x={(x + end) / 2}
          y={line - 16}
          fontSize="13"
          textAnchor="middle"
          className="font-cond"
          style={{ fill: 'var(--held-ink)' }}
        >
          {words}
        </text>
      )}
    </>
  );
}

/** The width it has; until that is known, the one it is drawn for. */
function useWidth(drawnFor: number) {
  const element = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(drawnFor);
  useEffect(() => {
    const watched = element.current;
    if (!watched) return;
    const observer = new ResizeObserver(([entry]) =>
      setWidth(Math.max(240, Math.floor(entry?.contentRect.width ?? drawnFor))),
    );
    observer.observe(watched);
    return () => observer.disconnect();
  }, [drawnFor]);
  return { element, width };
}
