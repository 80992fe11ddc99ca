import { redirect } from 'next/navigation';

import { readOnServer } from '@/app/_kit/prefetch';
import { getMeEndpoint } from '@/lib/session/endpoints';

export default async function SettingsPage() {
  const { roles } = await readOnServer(getMeEndpoint, {});
  redirect(roles.includes('admin') ? '/settings/shop' : '/settings/account');
}
