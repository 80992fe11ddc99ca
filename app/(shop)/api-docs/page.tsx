import type { Metadata } from 'next';

import { readOnServer } from '@/app/_kit/prefetch';
import { ApiDocs } from '@/components/api-docs/api-docs';
import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import { readableOperation } from '@/lib/api/readable-operation';
import { PERMISSIONS } from '@/lib/auth/permissions';
import { env } from '@/lib/env';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'The API' };

export default async function ApiDocsPage() {
  await readOnServer(getMeEndpoint, {});
  const holders = Object.fromEntries(
    Object.entries(PERMISSIONS).map(([name, roles]) => [
      name,
      roles === 'everyone' ? 'everyone' : roles.join(', '),
    ]),
  );
  return (
    <ApiDocs
      operations={ALL_ENDPOINTS.map(({ declaration }) => readableOperation(declaration))}
      holders={holders}
      address={env.APP_URL}
    />
  );
}
