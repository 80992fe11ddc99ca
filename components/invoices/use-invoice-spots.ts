'use client';
import { useCallback, useState } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';

import { useLazyRead } from '@/components/api/use-api';
import type { Spot } from '@/components/certificates/use-reading';
import { getInvoiceReading, type InvoiceReading } from '@/lib/invoices/reading-contract';

import { whatRead, type EnterIn, type EnterOut } from './enter-values';

const LOOK_AGAIN_MS = 1500;

/** Where a field of the form stands among what was read: the head's by name, a line's by what stands in its row. */
const HEAD = { number: 'invoice_number', datedOn: 'invoice_date', dueOn: 'due_date', totalMinor: 'total' };
const CELLS = {
  what: 'part_number',
  description: 'part_number',
  pieces: 'qty',
  unitPriceMinor: 'unit_price',
  amountMinor: 'amount',
};

/** The field's element, for the thread to end at. */
export const fieldId = (field: string): string => `row-${field}`;

/** What was read on the invoice, and which field of the form is looked for on its page. Looks again until it is read. */
export function useInvoiceSpots(invoiceId: string, form: UseFormReturn<EnterIn, unknown, EnterOut>) {
  const { data: read } = useLazyRead(
    getInvoiceReading,
    { invoiceId },
    { refreshEveryMs: LOOK_AGAIN_MS, refreshWhile: ({ state }) => state === 'waiting' },
  );
  const [selected, setSelected] = useState<string | null>(null);
  /** Counts the pages drawn, for what points at the one on the screen. */
  const [drawn, setDrawn] = useState(0);
  const onDrawn = useCallback(() => setDrawn((count) => count + 1), []);
  const kinds = useWatch({
    control: form.control,
    name: 'lines',
    compute: (lines: EnterIn['lines']) => lines.map(({ what }) => what).join('\n'),
  });
  const places = placesOf(read, kinds.split('\n'));
  const fact = selected === null ? undefined : read?.facts[places.get(selected) ?? -1];
  return {
    read,
    selected,
    choose: setSelected,
    drawn,
    onDrawn,
    fact,
    page: read?.pages.find(({ number }) => number === fact?.page),
    spots: spotsOf(read, places, selected),
  };
}
export type InvoiceSpots = ReturnType<typeof useInvoiceSpots>;

/** The fact behind each field of the form, by the field's name. Lines are found by what they are for, the first by the first. */
function placesOf(read: InvoiceReading | undefined, kinds: readonly string[]): Map<string, number> {
  const places = new Map<string, number>();
  if (!read) return places;
  const put = (name: string, ...fields: string[]) => {
    const at = read.facts.findIndex(({ field }) => fields.includes(field));
    if (at >= 0) places.set(name, at);
  };
  for (const [name, field] of Object.entries(HEAD)) put(name, field);
  const left = [...read.lines];
  kinds.forEach((kind, at) => {
    const found = left.findIndex((line) => whatRead(line) === kind);
    const [line] = found < 0 ? [] : left.splice(found, 1);
    if (!line) return;
    for (const [name, cell] of Object.entries(CELLS))
      // A charge is one sum, wherever in its line one is.
      put(
        `lines.${at}.${name}`,
        `${line.field}.${cell}`,
        line.field,
        ...(line.kind === 'pieces' ? [] : [`${line.field}.amount`]),
      );
  });
  return places;
}

/** One spot for each fact; where several fields rest on one, the selected or the first is it. */
function spotsOf(
  read: InvoiceReading | undefined,
  places: ReadonlyMap<string, number>,
  selected: string | null,
): Spot[] {
  const spots = new Map<number, Spot>();
  for (const [row, at] of places) {
    const fact = read?.facts[at];
    if (fact && (row === selected || !spots.has(at)))
      spots.set(at, { fact: at, page: fact.page, box: fact.box, row, verdict: 'to_decide' });
  }
  return [...spots.values()];
}
