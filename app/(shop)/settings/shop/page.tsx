import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ShopScreen } from '@/components/settings/shop-screen';
import { getShopSettingsEndpoint } from '@/lib/organisations/endpoints';

export const metadata: Metadata = { title: 'Shop and policies' };

export default function ShopSettingsPage() {
  return (
    <Prefetched queries={[ask(getShopSettingsEndpoint, {})]}>
      <ShopScreen zones={['UTC', ...Intl.supportedValuesOf('timeZone')]} />
    </Prefetched>
  );
}
