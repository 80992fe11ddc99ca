import { amountText } from '@/lib/money';

/** A kind of thing as it is said: `sent_mail` is a "sent mail". */
export const kindWords = (entity: string): string => entity.replaceAll('_', ' ');

const JOBS: Record<string, string> = {
  'render-documents': 'making papers',
  'assemble-dossier': 'putting a dossier together',
  'pay-invoice': 'paying',
  'work-payment-event': 'told by the payment service',
};

/** What the background work was at when it did something. */
export const jobWords = (queue: string): string => JOBS[queue] ?? 'by itself';

const PAGES: Record<string, string> = {
  batch: '/batches',
  lot: '/lots',
  part: '/parts',
  assembly: '/assemblies',
  invoice: '/invoices',
  processor: '/processors',
  certificate: '/certificates',
  nonconformance: '/nonconformances',
};

/** The page of a thing, where it has one. */
export function pageOfThing(entity: string, id: string): string | null {
  const page = PAGES[entity];
  return page === undefined ? null : `${page}/${id}`;
}

export interface Change {
  field: string;
  before: string | null;
  after: string | null;
}

/** The fields that are different, in words; with one side only, all of that side. An id alone tells a reader nothing. */
export function changesBetween(
  before: Record<string, unknown> | null,
  after: Record<string, unknown> | null,
): Change[] {
  const names = [...new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})])];
  return names
    .filter((name) => !isId(before?.[name]) && !isId(after?.[name]))
    .map((name) => ({
      field: fieldWords(name),
      before: wordsOf(name, before?.[name]),
      after: wordsOf(name, after?.[name]),
    }))
    .filter((change) => change.before !== change.after);
}

/** Sums are kept in minor units and read in whole ones. */
const wordsOf = (name: string, value: unknown): string | null =>
  name.endsWith('Minor') && typeof value === 'number' ? amountText(value) : valueWords(value);

const fieldWords = (name: string): string =>
  name
    .replace(/Minor$/, '')
    .replaceAll(/([A-Z])/g, ' $1')
    .replaceAll('_', ' ')
    .toLowerCase();

/** Kept to the thousandth of a second in UTC; the entry itself keeps the rest. */
const MOMENT = /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(?:\.\d+)?Z$/;

function valueWords(value: unknown): string | null {
  if (value === undefined || value === null || value === '') return null;
  if (typeof value === 'string')
    return MOMENT.test(value) ? `${value.slice(0, 10)} ${value.slice(11, 16)} UTC` : value;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value))
    return value
      .map((item) => valueWords(item) ?? 'none')
      .join(value.some((item) => typeof item === 'object') ? '; ' : ', ');
  return typeof value === 'object' ? objectWords(value) : JSON.stringify(value);
}

const ID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;
const isId = (value: unknown): boolean =>
  Array.isArray(value) ? value.length > 0 && value.every(isId) : typeof value === 'string' && ID.test(value);

/** What is nothing or an id inside a thing tells a reader nothing; the entry itself keeps it. */
function objectWords(value: object): string {
  const told = Object.entries(value).filter(([, inner]) => !isId(inner) && valueWords(inner) !== null);
  return told.map(([name, inner]) => `${fieldWords(name)} ${valueWords(inner) ?? ''}`).join(', ');
}
