import { numberFrom, type DecimalSign } from '../certificate/read/quantities';

export interface FoundMoney {
  readonly start: number;
  readonly end: number;
  readonly value: number;
  /** Printed with decimals or a currency: a sum and no count. */
  readonly isSum: boolean;
}

const CURRENCY = String.raw`(?:[A-Z]{2,3}\s?)?[$€£]|USD|EUR|GBP|CAD|AUD|CHF|NZD|SEK|NOK|DKK`;
const MONEY = new RegExp(
  String.raw`(?<![\p{L}\d/#.,-]|[\p{L}\d]-)(?<open>\(|[-−–]\s?)?(?<before>${CURRENCY})?\s?(?<minus>[-−])?(?<figures>\d{1,3}(?:[.,’']\d{3})+(?:[.,]\d{1,4})?|\d+(?:[.,]\d{1,4})?|[.,]\d{2,4})(?<after>\s?(?:${CURRENCY})(?![\p{L}]))?(?<close>\)|[-−](?=\s|$))?(?![\p{L}\d]|[.,:/-]\d|\s?%)`,
  'gu',
);

/** Sums and counts in a text, in its order; in brackets or with a minus they are below nothing. Percentages are none. */
export function moneyIn(text: string, sign: DecimalSign): FoundMoney[] {
  return [...text.matchAll(MONEY)].flatMap((match) => {
    const { open, before, minus, figures = '', after, close } = match.groups ?? {};
    const value = numberFrom(figures.replace(/[’']/g, ''), sign);
    if (Number.isNaN(value)) return [];
    const isBelow =
      (open === '(' && close === ')') || (!!open && open !== '(') || !!minus || (!!close && close !== ')');
    return [
      {
        start: match.index,
        end: match.index + match[0].length,
        value: isBelow ? -value : value,
        isSum: !!before || !!after || /[.,]\d{2,4}$/.test(figures),
      },
    ];
  });
}

/** The last sum of a text: what a line comes to. */
export const lastSum = (text: string, sign: DecimalSign): FoundMoney | null =>
  moneyIn(text, sign).findLast(({ isSum }) => isSum) ?? null;
