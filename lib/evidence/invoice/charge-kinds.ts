import { unaccented } from './unaccented';

/** What a line of an invoice that is no work on parts is for. */
export type ChargeKind =
  | 'lot_minimum_adjustment'
  | 'certification_fee'
  | 'freight'
  | 'tax'
  | 'subtotal'
  | 'total'
  | 'other'
  | 'paid';

/** In small letters without accents; the first that fits decides. */
const KINDS: readonly (readonly [ChargeKind, RegExp])[] = [
  [
    'subtotal',
    /sub-?\s?total|zwischensumme|sous-total|nettobetrag|summe netto|total (?:excl|exkl|ht|net|before|ohne|w\/o)|net (?:total|amount|value)|taxable|merchandise/,
  ],
  ['total', /total (?:\(?incl|inkl|ttc|mit|with|including|after)/],
  [
    'lot_minimum_adjustment',
    /\bmin(?:imum|\.)?\s*(?:lot|charge|order|billing|batch|adj)|lot\s*min|\bminimum\b|mindest|minimale?\s+(?:de\s+)?lot/,
  ],
  [
    'certification_fee',
    /\bcert(?:s\b|ific|\.|\b)|c\s?of\s?c\b|\bcoc\b|paperwork|documentation|zeugnis|bescheinigung|prufprotokoll|attestation/,
  ],
  [
    'tax',
    /\b(?:sales|use|state|local)?\s?tax(?!\s*(?:id|no|number|invoice|exempt))(?:es)?\b|\bv\.?a\.?t\.?\b(?!\s*(?:no|reg|id|number))|mws?st|mehrwertsteuer|ust\b|umsatzsteuer|\btva\b|\bgst\b|\bhst\b|\biva\b|\bbtw\b/,
  ],
  [
    'freight',
    /\bfreight|\bshipping\b|\bdelivery\b|carriage|postage|courier|fracht|versand|porto\b|transport|\bport\b/,
  ],
  ['paid', /amount paid|paid to date|deposit|prepaid|payment received|anzahlung|acompte/],
  [
    'total',
    /\btotal\b|amount due|balance(?: due)?|amount payable|please pay|gesamt(?:betrag|summe)?\b|rechnungsbetrag|endbetrag|zu zahlen|bruttobetrag|net a payer|a payer|importe total/,
  ],
  [
    'other',
    /surcharge|\bfee\b|\bcharge\b|expedite|\brush\b|environmental|\benergy\b|\bfuel\b|handling|set-?\s?up|packag|packing|zuschlag|gebuhr|\bfrais\b|discount|rabatt|remise|masking|fixture/,
  ],
];

/** What a label or description says is charged; null where it says none of these. */
export function chargeKind(text: string): ChargeKind | null {
  const small = unaccented(text);
  return KINDS.find(([, pattern]) => pattern.test(small))?.[0] ?? null;
}

/** The total that is asked for goes before others that are called so. */
export const asksForPayment = (text: string): boolean =>
  /amount due|balance|total due|amount payable|please pay|grand total|invoice total|rechnungsbetrag|endbetrag|zu zahlen|a payer|total (?:amount|incl|ttc|eur|usd|gbp|payable)/i.test(
    unaccented(text),
  );
