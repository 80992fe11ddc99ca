import { spotIn, type Passage, type Spot } from '../layout/passage';
import type { BankDetails } from './invoice';

const NO = String.raw`(?:\s*(?:no\.?|nr\.?|number|num\.?|#|code))*\s*[:.#]*\s*`;

/** Each with its value as the first group. */
const ACCOUNTS: Readonly<Record<keyof BankDetails, RegExp>> = {
  // Its two check digits may be recognised as letters.
  iban: /\bIBAN\b[\s:.]*([A-Z]{2}[\dO]{2}(?:\s?(?!BIC|SWIFT)[A-Z0-9]{2,4}){3,8})(?![A-Z0-9])/i,
  account: new RegExp(
    String.raw`\b(?:bank\s+)?(?:account|acct\.?|a\/c|konto|compte)${NO}(\d[\d\s-]{3,20}\d)`,
    'i',
  ),
  routing: new RegExp(
    String.raw`\b(?:aba|routing|rtn|sort\s+code|blz|bsb|transit)(?:\s*(?:\/|and|&)?\s*(?:aba|routing|transit))?${NO}(\d[\d\s-]{4,12}\d)`,
    'i',
  ),
  swift:
    /\b(?:SWIFT|BIC)(?:\s*[/-]\s*(?:BIC|SWIFT))?(?:\s*code)?[\s:.#]*([A-Z]{4}[A-Z]{2}[A-Z0-9]{2}(?:[A-Z0-9]{3})?)(?![A-Z0-9])/i,
};

/** A number that is called an account is a bank's only where a bank is spoken of. */
const OF_BANK = /\b(?:bank|iban|swift|routing|aba|ach|wire|remit|sort code|konto|blz|virement)\b/i;

export interface FoundAccount {
  readonly key: keyof BankDetails;
  readonly value: string;
  readonly spot: Spot;
}

/** The third and fourth sign of an IBAN are digits. */
const withCheckDigits = (iban: string): string =>
  iban.slice(0, 2) + iban.slice(2, 4).replace(/O/gi, '0') + iban.slice(4);

/** The numbers of the account that an invoice asks to be paid to, from its lines. */
export function accountsIn(lines: readonly Passage[]): FoundAccount[] {
  const isOfBank = OF_BANK.test(lines.map(({ text }) => text).join('\n'));
  const keys = ['iban', 'account', 'routing', 'swift'] as const;
  return keys.flatMap((key): FoundAccount[] => {
    if (key === 'account' && !isOfBank) return [];
    for (const line of lines) {
      const match = ACCOUNTS[key].exec(line.text);
      const value = match?.[1]?.trim();
      if (!match || value === undefined || /customer|kunden/i.test(line.text.slice(0, match.index))) continue;
      const start = match.index + match[0].lastIndexOf(value);
      const spot = spotIn(line, start, start + value.length);
      if (spot) return [{ key, value: key === 'iban' ? withCheckDigits(value) : value, spot }];
    }
    return [];
  });
}
