'use client';
import { useEffect, useRef } from 'react';

import type { Fact } from '@/lib/evidence/fact';
import type { KeptPage } from '@/lib/readings/kept-reading';

const [WIDTH, HEIGHT] = [236, 64];
/** Points around the words, so that one sees what stands beside them. */
const AROUND = 14;
const LARGEST = 4;

/** The spot on the page, enlarged: cut out of the page as it is drawn beside the list. */
export function SpotPicture({ fact, page, drawn }: { fact: Fact; page: KeptPage; drawn: number }) {
  const canvas = useRef<HTMLCanvasElement>(null);
  useEffect(() => {
    const picture = document.querySelector<HTMLCanvasElement | HTMLImageElement>(
      '.lw-sheet canvas, img.lw-drawn',
    );
    if (canvas.current) canvas.current.hidden = picture === null;
    if (canvas.current && picture) cutOut(canvas.current, picture, fact, page);
    // Cut again whenever a page was drawn: it may still have been on its way.
  }, [fact, page, drawn]);
  return (
    <canvas
      ref={canvas}
      width={WIDTH * 2}
      height={HEIGHT * 2}
      style={{ width: WIDTH, height: HEIGHT }}
      className="flex-none border border-line bg-white"
      role="img"
      aria-label={`On the page: ${fact.raw}`}
    />
  );
}

function cutOut(
  to: HTMLCanvasElement,
  drawn: HTMLCanvasElement | HTMLImageElement,
  { box }: Fact,
  page: KeptPage,
) {
  const wide = 'naturalWidth' in drawn ? drawn.naturalWidth : drawn.width;
  if (wide === 0) return;
  const pixels = wide / page.width;
  const [left, top, right, bottom] = box.map((points) => points * pixels) as [number, number, number, number];
  const around = AROUND * pixels;
  const scale = Math.min(
    LARGEST,
    to.width / (right - left + 2 * around),
    to.height / (bottom - top + 2 * around),
  );
  const [width, height] = [to.width / scale, to.height / scale];
  const [x, y] = [(left + right - width) / 2, (top + bottom - height) / 2];
  const context = to.getContext('2d');
  if (!context) return;
  context.fillStyle = '#fff';
  context.fillRect(0, 0, to.width, to.height);
  context.drawImage(drawn, x, y, width, height, 0, 0, to.width, to.height);
  context.strokeStyle = '#26527b';
  context.lineWidth = 3;
  context.strokeRect(
    (left - x - pixels * 2) * scale,
    (top - y - pixels * 2) * scale,
    (right - left + pixels * 4) * scale,
    (bottom - top + pixels * 4) * scale,
  );
}
