import { linesOf } from '../../layout/lines';
import type { Page } from '../../page';
import { mostBelieved } from './candidates';
import { CERTIFICATE_NUMBER, codesFor, PURCHASE_ORDER, sameCode } from './identity';
import { paperOf } from './paper';

const TITLE = /\b(?:certificat(?:e|ion)|report|zeugnis|bescheinigung|certificado)\b/i;
const PAGE_OF =
  /\b(?:page|seite|p[aá]gina|pg\.?|sheet)\s*:?\s*(\d{1,2})\s*(?:of|\/|von|de|sur)\s*(\d{1,2})\b/i;

/**
 * The pages of a file, certificate by certificate.
 *
 * A page begins another certificate when it has a number of its own, or when it counts as page 1 again; one without a number
 * goes with the page before it.
 */
export function splitCertificates(pages: readonly Page[]): Page[][] {
  const certificates: { pages: Page[]; number: string | null; order: string | null }[] = [];
  for (const page of pages) {
    const seen = signsOf(page);
    const open = certificates[certificates.length - 1];
    if (open && !begins(seen, open)) {
      open.pages.push(page);
      open.number ??= seen.number;
      open.order ??= seen.order;
    } else certificates.push({ pages: [page], number: seen.number, order: seen.order });
  }
  return certificates.map((certificate) => certificate.pages);
}

interface Signs {
  readonly number: string | null;
  readonly order: string | null;
  readonly titled: boolean;
  readonly pageOf: number | null;
}

function signsOf(page: Page): Signs {
  const paper = paperOf([page]);
  const number = mostBelieved(codesFor(paper, CERTIFICATE_NUMBER), sameCode);
  const order = mostBelieved(codesFor(paper, PURCHASE_ORDER), sameCode);
  const head = linesOf(page).slice(0, 10);
  return {
    number: number?.value ?? null,
    order: order?.value ?? null,
    titled: head.some(({ segments }) => segments.some(({ text }) => TITLE.test(text) && text.length < 60)),
    pageOf: Number(PAGE_OF.exec(paper.text)?.[1] ?? NaN) || null,
  };
}

function begins(
  seen: Signs,
  open: { readonly number: string | null; readonly order: string | null },
): boolean {
  if (seen.pageOf !== null && seen.pageOf > 1) return false;
  if (seen.number !== null && open.number !== null) return !sameCode(seen.number, open.number);
  if (seen.pageOf === 1) return true;
  // Neither has a number: another order under another title is another certificate.
  return (
    seen.number === null &&
    open.number === null &&
    seen.titled &&
    seen.order !== null &&
    open.order !== null &&
    !sameCode(seen.order, open.order)
  );
}
