const WHAT: Record<string, string> = {
  'render-documents': 'The traveller and the purchase order were not made.',
  'pay-invoice': 'The payment was not handed to the payment service.',
  'work-payment-event': 'What the payment service told was not entered.',
  'read-document': 'The machine did not read a file that came in. A person reads it.',
  'assemble-dossier': 'The dossier was not put together.',
};

/** What did not happen, for a person. Of the payload only what a person may read: never links, never a mail's text. */
export function failureWords(queue: string, data: Record<string, unknown>): string {
  if (queue !== 'send-mail') return WHAT[queue] ?? `The job ${queue} did not finish.`;
  const to = Array.isArray(data['to']) ? data['to'].filter((one) => typeof one === 'string').join(', ') : '';
  const template = typeof data['template'] === 'string' ? data['template'].replaceAll('-', ' ') : 'mail';
  return `The mail “${template}” to ${to} did not leave.`;
}

const PAGES: readonly (readonly [string, string])[] = [
  ['batchId', '/batches'],
  ['invoiceId', '/invoices'],
  ['lotId', '/lots'],
];

export function aboutOf(data: Record<string, unknown>): string | null {
  for (const [name, page] of PAGES) {
    const id = data[name];
    if (typeof id === 'string' && /^[0-9a-f-]{36}$/.test(id)) return `${page}/${id}`;
  }
  return null;
}
