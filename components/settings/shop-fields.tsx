'use client';
import type { UseFormReturn } from 'react-hook-form';
import { useWatch } from 'react-hook-form';

import { Checkbox, RadioGroup } from '@/components/ui/choice';
import { NumberInput, SelectField, TextArea, TextField } from '@/components/ui/field';
import { CURRENCIES, type Currency } from '@/lib/money';

export interface ShopForm {
  name: string;
  address: string;
  phone: string;
  zone: string;
  currency: Currency;
  orderPrefix: string;
  dispatchAndAcceptance: 'refuse' | 'record';
  approvalAndPayment: 'refuse' | 'record';
  secondApproval: boolean;
  secondApprovalAbove: string;
  latenessBasis: 'first_promise' | 'latest_promise';
}

type Form = UseFormReturn<ShopForm>;

/** @param zones the server's own list: the browser's may know other names, and the server has the last word. */
export function ShopFields({ form, zones }: { form: Form; zones: readonly string[] }) {
  const { errors, defaultValues } = form.formState;
  return (
    <div className="grid gap-x-6 gap-y-3 pt-1 md:grid-cols-2">
      <TextField label="Name" error={errors.name?.message} {...form.register('name')} />
      <TextField
        label="Telephone"
        type="tel"
        hint="whom a processor rings"
        error={errors.phone?.message}
        {...form.register('phone')}
      />
      <TextArea
        label="Address"
        rows={3}
        hint="line by line, as on a letter"
        error={errors.address?.message}
        {...form.register('address')}
      />
      <div className="flex flex-col gap-3">
        <SelectField
          label="Time zone"
          options={[...new Set([defaultValues?.zone ?? 'UTC', ...zones])].map((zone) => ({
            value: zone,
            says: zone.replaceAll('_', ' '),
          }))}
          error={errors.zone?.message}
          {...form.register('zone')}
        />
        <div className="grid grid-cols-2 gap-3">
          <SelectField
            label="Currency"
            hint="of new batches"
            options={CURRENCIES.map((currency) => ({ value: currency, says: currency }))}
            error={errors.currency?.message}
            {...form.register('currency')}
          />
          <TextField
            label="Order numbers begin with"
            mono
            hint="as TS in TS-1187"
            error={errors.orderPrefix?.message}
            {...form.register('orderPrefix')}
          />
        </div>
      </div>
    </div>
  );
}

const SEPARATION = [
  { value: 'record', says: 'Allow it, and record it', note: 'for a shop of two' },
  { value: 'refuse', says: 'Refuse it' },
] as const;

export function PolicyFields({ form, currency }: { form: Form; currency: string }) {
  const { errors } = form.formState;
  const asksSecond = useWatch({ control: form.control, name: 'secondApproval' });
  return (
    <div className="grid gap-x-6 gap-y-5 pt-1 md:grid-cols-2">
      <RadioGroup
        label="One person dispatches a batch and accepts its certificate"
        options={SEPARATION}
        {...form.register('dispatchAndAcceptance')}
      />
      <RadioGroup
        label="One person approves an invoice and pays it"
        options={SEPARATION}
        {...form.register('approvalAndPayment')}
      />
      <div className="flex flex-col gap-2">
        <Checkbox says="A large invoice needs an admin’s approval too" {...form.register('secondApproval')} />
        {asksSecond && (
          <NumberInput
            label="Above"
            unit={currency}
            className="max-w-56"
            error={errors.secondApprovalAbove?.message}
            {...form.register('secondApprovalAbove')}
          />
        )}
      </div>
      <RadioGroup
        label="Lateness counts from"
        options={[
          { value: 'latest_promise', says: 'the latest promise', note: 'a new promise moves the end' },
          { value: 'first_promise', says: 'the first promise', note: 'whatever is promised later' },
        ]}
        {...form.register('latenessBasis')}
      />
    </div>
  );
}
