import { unaccented } from './unaccented';

/** What an invoice's labels ask for. */
export type InvoiceLabel = 'invoice_number' | 'invoice_date' | 'date' | 'due_date' | 'terms' | 'other';

const NUMBER = String.raw`(?:no\.?|nr\.?|n[°º]|num(?:ber|mer|ero|ero)?|#|ref(?:erence)?)`;

/** At the beginning of a text in small letters without accents. A label that asks for something else keeps its value from being taken. */
const LABELS: readonly (readonly [InvoiceLabel, RegExp])[] = [
  [
    'due_date',
    /^(?:payment\s+)?(?:due(?:\s+(?:date|on|by))?|date\s+due|(?:please\s+)?pay(?:able)?\s+by|payment\s+(?:date|by))(?![a-z])/,
  ],
  [
    'due_date',
    /^(?:fallig(?:keit(?:sdatum)?)?(?:\s+am)?|zahlbar\s+bis|date\s+d['’]echeance|echeance|vencimiento)(?![a-z])/,
  ],
  [
    'terms',
    /^(?:(?:payment\s+)?terms(?:\s+of\s+payment)?|zahlungs(?:bedingungen|ziel)|conditions\s+de\s+(?:paiement|reglement))(?![a-z])/,
  ],
  [
    'invoice_date',
    /^(?:invoice\s+date|date\s+of\s+invoice|inv\.?\s+date|bill\s+date|billing\s+date|date\s+issued|issue\s+date|issued(?:\s+on)?|rechnungs-?\s?datum|date\s+(?:de\s+(?:la\s+)?)?facture|fecha\s+de\s+factura)(?![a-z])/,
  ],
  [
    'invoice_number',
    new RegExp(
      String.raw`^(?:tax\s+|commercial\s+)?(?:invoice|inv\.?|bill|rechnungs?|facture|factura)[\s.:-]*${NUMBER}(?![a-z])`,
    ),
  ],
  ['invoice_number', /^(?:tax\s+|commercial\s+)?(?:invoice|rechnung|facture)(?=\s*[:#]|\s+[a-z]{0,4}-?\d)/],
  [
    'other',
    /^(?:date\s+(?:shipped|received|ordered|of\s+order)|(?:ship(?:ped|ping)?|order|delivery|service|work|received)\s+date|shipped|bestelldatum|lieferdatum|leistungsdatum)(?![a-z])/,
  ],
  ['date', /^(?:date|dated|datum|fecha|data)(?![a-z])/],
];

export interface FoundInvoiceLabel {
  readonly label: InvoiceLabel;
  /** Where its value may begin. */
  readonly end: number;
}

const MARK = /^\s*(?:\([^)]{0,20}\)\s*)?[:.#=\-–]*\s*/;

/** The label that a text begins with. */
export function invoiceLabelAt(text: string): FoundInvoiceLabel | null {
  const lead = /^\s*/.exec(text)?.[0].length ?? 0;
  const small = unaccented(text.slice(lead));
  for (const [label, pattern] of LABELS) {
    const match = pattern.exec(small);
    if (!match) continue;
    const end = lead + match[0].length;
    return { label, end: end + (MARK.exec(text.slice(end))?.[0].length ?? 0) };
  }
  return null;
}
