import type { Component } from './find-components';

/** In inches: the largest dust, and how far from any letter it must lie. A full stop stands closer. */
const LARGEST_SPECK = 0.022;
const FAR_FROM_PRINT = 0.11;

/** Dust: small pieces of ink with no larger piece near. Full stops and points of decimals have their letter beside them. */
export function findSpecks(components: readonly Component[], dpi: number): Component[] {
  const largest = Math.max(2, Math.round(LARGEST_SPECK * dpi));
  const isSmall = ({ box }: Component) => box[2] - box[0] <= largest && box[3] - box[1] <= largest;
  const cell = Math.max(1, Math.round(FAR_FROM_PRINT * dpi));
  const print = new Set<string>();
  for (const component of components) {
    if (isSmall(component)) continue;
    const [left, top, right, bottom] = component.box.map((edge) => Math.floor(edge / cell)) as [
      number,
      number,
      number,
      number,
    ];
    // Long lines occupy their rim only.
    if (right - left > 40 || bottom - top > 40) continue;
    for (let row = top; row <= bottom; row++) {
      for (let column = left; column <= right; column++) print.add(`${column},${row}`);
    }
  }
  return components.filter((component) => {
    if (!isSmall(component)) return false;
    const column = Math.floor((component.box[0] + component.box[2]) / 2 / cell);
    const row = Math.floor((component.box[1] + component.box[3]) / 2 / cell);
    for (let r = row - 1; r <= row + 1; r++) {
      for (let c = column - 1; c <= column + 1; c++) {
        if (print.has(`${c},${r}`)) return false;
      }
    }
    return true;
  });
}
