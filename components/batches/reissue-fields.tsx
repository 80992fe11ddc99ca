'use client';
import { useState } from 'react';

import { amountField, typedAmount } from '@/components/invoices/amount-field';
import { Button } from '@/components/ui/button';
import { NumberInput, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import type { BatchLine, Requirement } from '@/lib/batches/contract';
import { linesWords } from '@/lib/parts/lines-words';

/** What has been typed so far; prices and limits only where they were touched. */
export interface ReissueTyped {
  wantedBackOn: string;
  note: string;
  minimum: string;
  fee: string;
  prices: Readonly<Record<string, string>>;
  limits: Readonly<Record<string, { limit: string; unit: string }>>;
}

const Amount = amountField({ name: 'The amount' });

const orNothing = (text: string) => (text.trim() === '' ? '0' : text);

/** What is wrong with an amount as typed; nothing typed counts as nothing. */
export function amountFault(text: string): string | undefined {
  const read = Amount.safeParse(orNothing(text));
  return read.success ? undefined : read.error.issues[0]?.message;
}

export const readAmount = (text: string) => Amount.parse(orNothing(text));

interface FieldsProps {
  lines: readonly BatchLine[];
  typed: ReissueTyped;
  set: (part: Partial<ReissueTyped>) => void;
}

export function PriceFields({ lines, currency, typed, set }: FieldsProps & { currency: string }) {
  return (
    <Section title="Prices" note="pieces and lots are frozen">
      {lines.map((line) => {
        const text = typed.prices[line.id] ?? typedAmount(line.unitPriceMinor);
        return (
          <div key={line.id} className="flex flex-wrap items-end gap-x-4 gap-y-1 border-b border-rule py-2">
            <span className="min-w-64 flex-1 md:pb-2">
              <span className="num font-semibold">{line.partNumber}</span> {line.partName}, {line.pieces} pc
            </span>
            <NumberInput
              className="w-40"
              label={`Line ${line.lineNo}, each`}
              unit={currency}
              value={text}
              error={amountFault(text)}
              onChange={(event) => set({ prices: { ...typed.prices, [line.id]: event.currentTarget.value } })}
            />
          </div>
        );
      })}
    </Section>
  );
}

export function LimitFields({
  lines,
  requirements,
  typed,
  set,
}: FieldsProps & { requirements: readonly Requirement[] }) {
  const [apart, setApart] = useState<readonly string[]>([]);
  const groups = alikeGroups(requirements).flatMap((group) =>
    apart.includes(group[0].id) ? group.map((one): Alike => [one]) : [group],
  );
  return (
    <Section title="What must be proved" note="what a certificate was already compared with stays">
      {groups.map((group) => (
        <LimitField
          key={group[0].id}
          group={group}
          says={nameOf(group, lines)}
          now={typed.limits[group[0].id] ?? group[0]}
          change={(now) =>
            set({
              limits: { ...typed.limits, ...Object.fromEntries(group.map(({ id }) => [id, now])) },
            })
          }
          split={() => setApart((was) => [...was, group[0].id])}
        />
      ))}
    </Section>
  );
}

interface LimitFieldProps {
  group: Alike;
  says: string;
  now: Limit;
  change: (now: Limit) => void;
  split: () => void;
}

function LimitField({ group, says, now: { limit, unit }, change, split }: LimitFieldProps) {
  return (
    <div className="flex flex-wrap items-end gap-3 border-b border-rule py-2">
      <TextField
        className="max-w-xl min-w-40 flex-1"
        label={says}
        mono
        value={limit}
        onChange={(event) => change({ limit: event.currentTarget.value, unit })}
      />
      <TextField
        className="w-24"
        label="Unit"
        mono
        value={unit}
        onChange={(event) => change({ limit, unit: event.currentTarget.value })}
      />
      {group.length > 1 && (
        <span className="pb-2">
          <Button look="word" onClick={split}>
            Line by line<span className="sr-only">: {says}</span>
          </Button>
        </span>
      )}
    </div>
  );
}

type Limit = Pick<Requirement, 'limit' | 'unit'>;
type Alike = readonly [Requirement, ...Requirement[]];

/** Lines that ask the same stand together: most re-issues change a limit for all of them. */
function alikeGroups(requirements: readonly Requirement[]): Alike[] {
  const groups = new Map<string, Alike>();
  for (const one of requirements) {
    const key = JSON.stringify([one.characteristic, one.limit, one.unit, one.lineId === null]);
    const known = groups.get(key);
    groups.set(key, known ? [...known, one] : [one]);
  }
  return [...groups.values()];
}

function nameOf(group: Alike, lines: readonly BatchLine[]): string {
  const numbers = lines
    .filter((line) => group.some((one) => one.lineId === line.id))
    .map((line) => line.lineNo);
  return [group[0].characteristic, linesWords(numbers)].filter(Boolean).join(', ');
}
