'use client';
import { useEffect, useRef } from 'react';

/** A thin line from the lit spot on the page to the row or field that is chosen, as long as both can be seen. */
export function Thread({ row, drawn }: { row: string | null; drawn: number }) {
  const path = useRef<SVGPathElement>(null);
  useEffect(() => {
    let frame = 0;
    const draw = () => {
      path.current?.setAttribute('d', pathBetween(row));
    };
    const drawSoon = () => {
      cancelAnimationFrame(frame);
      frame = requestAnimationFrame(draw);
    };
    drawSoon();
    window.addEventListener('scroll', drawSoon, { capture: true, passive: true });
    window.addEventListener('resize', drawSoon);
    return () => {
      cancelAnimationFrame(frame);
      window.removeEventListener('scroll', drawSoon, { capture: true });
      window.removeEventListener('resize', drawSoon);
    };
    // The page is drawn some time after the row is chosen.
  }, [row, drawn]);
  return (
    <svg
      aria-hidden="true"
      className="pointer-events-none fixed inset-0 z-20 h-full w-full max-lg:hidden print:hidden"
    >
      <path ref={path} fill="none" stroke="var(--ink)" strokeWidth="1.5" />
    </svg>
  );
}

function pathBetween(row: string | null): string {
  const spot = document.getElementById('lw-lit-spot');
  const button = row === null ? null : document.getElementById(`row-${row}`);
  // In a form there are no rows: the field itself.
  const [frame, list] = [spot?.closest('[role=region]'), button?.closest('tr') ?? button];
  if (!spot || !button || !frame || !list) return '';
  const [from, within, to] = [
    spot.getBoundingClientRect(),
    frame.getBoundingClientRect(),
    list.getBoundingClientRect(),
  ];
  const y = from.top + from.height / 2;
  const isSeen = y > within.top && y < within.bottom && to.top < window.innerHeight && to.bottom > within.top;
  if (!isSeen) return '';
  const [startX, endX, endY] = [Math.min(from.right + 20, within.right), to.left, to.top + to.height / 2];
  const half = (endX - startX) / 2;
  return `M${startX} ${y}C${startX + half} ${y} ${endX - half} ${endY} ${endX} ${endY}`;
}
