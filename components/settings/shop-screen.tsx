'use client';
import { useForm } from 'react-hook-form';
import { useRouter } from 'next/navigation';

import { showOnForm } from '@/components/api/show-on-form';
import { useRead, useWrite } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { amountText, parseAmount } from '@/lib/money';
import { getShopSettings, updateShopSettings, type ShopSettings } from '@/lib/organisations/contract';
import { getMe } from '@/lib/session/contract';

import { PolicyFields, ShopFields, type ShopForm } from './shop-fields';

export function ShopScreen({ zones }: { zones: readonly string[] }) {
  const { data: shop } = useRead(getShopSettings, {});
  return (
    <>
      <PageHead
        title="Shop and policies"
        sub="Batches, orders and invoices that exist keep what they were made under."
      />
      <div className="flex max-w-[52rem] flex-col gap-7">
        {/* A fresh form for a fresh version: what was typed into the older one is told about, not merged. */}
        <SettingsForm key={shop.version} shop={shop} zones={zones} />
        <History entity="shop" id={shop.id} title="Changes to the shop" />
      </div>
    </>
  );
}

function SettingsForm({ shop, zones }: { shop: ShopSettings; zones: readonly string[] }) {
  const router = useRouter();
  const write = useWrite(updateShopSettings, { refreshes: [getShopSettings, getMe] });
  const form = useForm<ShopForm>({ defaultValues: typedOf(shop) });
  const saved = () => {
    showMessage({ says: 'Shop saved.' });
    router.refresh();
  };
  const save = form.handleSubmit((typed) => {
    const above = typed.secondApproval ? parseAmount(typed.secondApprovalAbove) : null;
    if (typed.secondApproval && above === null)
      return form.setError(
        'secondApprovalAbove',
        { message: 'This is not an amount. Write it like 2,500.00.' },
        { shouldFocus: true },
      );
    return write.mutate(
      { ...choicesOf(typed), secondApprovalAboveMinor: above, version: shop.version },
      { onSuccess: saved, onError: showOnForm(form) },
    );
  });
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-7">
      <Section title="Shop" note="as it stands on travellers, orders and mails">
        <ShopFields form={form} zones={zones} />
      </Section>
      <Section title="Policies">
        <PolicyFields form={form} currency={shop.currency} />
      </Section>
      <div className="flex flex-col gap-3">
        <FormRefusal says={form.formState.errors.root?.message} />
        <div>
          <Button type="submit" look="primary" busy={write.isPending} busyLabel="Saving">
            Save the shop
          </Button>
        </div>
      </div>
    </form>
  );
}

const typedOf = (shop: ShopSettings): ShopForm => ({
  ...shop,
  address: shop.address.join('\n'),
  phone: shop.phone ?? '',
  secondApproval: shop.secondApprovalAboveMinor !== null,
  secondApprovalAbove:
    shop.secondApprovalAboveMinor === null ? '' : amountText(shop.secondApprovalAboveMinor),
});

function choicesOf({
  name,
  address,
  phone,
  zone,
  currency,
  orderPrefix,
  dispatchAndAcceptance,
  approvalAndPayment,
  latenessBasis,
}: ShopForm) {
  const lines = address.split('\n').map((line) => line.trim());
  return {
    name,
    address: lines.filter((line) => line !== ''),
    phone: phone.trim() === '' ? null : phone,
    zone,
    currency,
    orderPrefix,
    dispatchAndAcceptance,
    approvalAndPayment,
    latenessBasis,
  };
}
