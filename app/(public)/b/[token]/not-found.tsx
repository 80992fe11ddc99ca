import { headers } from 'next/headers';

import { readOnServer } from '@/app/_kit/prefetch';
import { LinkEnded } from '@/components/portal/link-ended';
import { readBatchLinkEndpoint } from '@/lib/portal/link-endpoints';

/** Says which kind of "not" it is; the token comes from the address, because this page is given no parameters. */
export default async function LinkNotFound() {
  const path = (await headers()).get('x-path') ?? '';
  const token = decodeURIComponent(/^\/b\/([^/?]+)/.exec(path)?.[1] ?? 'none');
  const face = await readOnServer(readBatchLinkEndpoint, { token });
  return <LinkEnded {...face} />;
}
