import type { KeyboardEvent } from 'react';

/** Arrow keys: along a lane, and to the nearest tag of the lane above or below. */
export function walkTags(event: KeyboardEvent<HTMLElement>): void {
  const step = STEPS[event.key];
  if (!step || !(document.activeElement instanceof HTMLAnchorElement)) return;
  const links = [
    ...event.currentTarget.querySelectorAll<HTMLAnchorElement>('ol ol a[href]:not([tabindex="-1"])'),
  ];
  const here = document.activeElement.getBoundingClientRect();
  const next = links
    .filter((link) => link !== document.activeElement)
    .map((link) => ({ link, at: link.getBoundingClientRect() }))
    .filter(({ at }) => step.isAhead(here, at))
    .sort((a, b) => step.distance(here, a.at) - step.distance(here, b.at))[0];
  if (!next) return;
  event.preventDefault();
  next.link.focus({ preventScroll: false });
}

interface Step {
  isAhead(from: DOMRect, to: DOMRect): boolean;
  distance(from: DOMRect, to: DOMRect): number;
}

// Sideways distance counts little between rows, so that down goes down and not far along.
const across = (a: DOMRect, b: DOMRect) => Math.abs(a.left - b.left) + 8 * Math.abs(a.top - b.top);
const down = (a: DOMRect, b: DOMRect) => Math.abs(a.top - b.top) + Math.abs(a.left - b.left) / 8;

const STEPS: Partial<Record<string, Step>> = {
  ArrowRight: { isAhead: (a, b) => b.left > a.left + 1, distance: across },
  ArrowLeft: { isAhead: (a, b) => b.left < a.left - 1, distance: across },
  ArrowDown: { isAhead: (a, b) => b.top > a.top + 2, distance: down },
  ArrowUp: { isAhead: (a, b) => b.top < a.top - 2, distance: down },
};
