import { amountField, typedAmount } from '@/components/invoices/amount-field';
import { NumberInput, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import type { BatchLine, Requirement } from '@/lib/batches/contract';

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
          <div key={line.id} className="flex flex-wrap items-start gap-4 border-b border-rule py-2">
            <span className="min-w-64 flex-1 pt-1">
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
  return (
    <Section title="What must be proved" note="what a certificate was already compared with stays">
      {requirements.map((one) => {
        const now = typed.limits[one.id] ?? one;
        const lineNo = lines.find((line) => line.id === one.lineId)?.lineNo;
        const change = (part: Partial<{ limit: string; unit: string }>) =>
          set({
            limits: { ...typed.limits, [one.id]: { limit: now.limit, unit: now.unit, ...part } },
          });
        const name = `${one.characteristic}${lineNo === undefined ? '' : `, line ${lineNo}`}`;
        return (
          <div key={one.id} className="flex flex-wrap items-start gap-3 border-b border-rule py-2">
            <TextField
              className="min-w-64 flex-1"
              label={name}
              mono
              value={now.limit}
              onChange={(event) => change({ limit: event.currentTarget.value })}
            />
            <TextField
              className="w-32"
              label="Unit"
              mono
              value={now.unit}
              onChange={(event) => change({ unit: event.currentTarget.value })}
            />
          </div>
        );
      })}
    </Section>
  );
}
