import type { Spot } from '../../layout/passage';
import type { Fact } from '../../fact';
import { calibrated } from './calibration';

interface Found {
  readonly value: string | number | boolean | null;
  readonly spot: Spot | null;
  /** 0 to 1, before calibration and before how legible the words are. */
  readonly belief: number;
  readonly unit?: string | undefined;
}

/** Gathers facts; each is given once, as the document's shape names it. */
export class FactCollector {
  readonly facts: Fact[] = [];

  /** Notes a fact and hands back its value, so that the document and its facts cannot differ. */
  note<Value extends string | number | boolean | null>(
    field: string,
    found: (Found & { readonly value: Value }) | null,
  ): Value | null {
    if (!found?.spot) return found?.value ?? null;
    const { spot, value, belief, unit } = found;
    const [left, top, right, bottom] = spot.box;
    const round = (points: number): number => Math.round(points * 10) / 10;
    this.facts.push({
      field,
      value,
      ...(unit !== undefined && { unit }),
      raw: spot.raw,
      page: spot.page,
      box: [round(left), round(top), round(right), round(bottom)],
      confidence: value === null ? 0.1 : calibrated(belief),
    });
    return value;
  }
}
