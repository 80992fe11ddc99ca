import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { TokensScreen } from '@/components/settings/tokens-screen';
import { listTokensEndpoint } from '@/lib/people/endpoints';

export const metadata: Metadata = { title: 'Tokens for programs' };

export default function TokensPage() {
  return (
    <Prefetched queries={[ask(listTokensEndpoint, {})]}>
      <TokensScreen />
    </Prefetched>
  );
}
