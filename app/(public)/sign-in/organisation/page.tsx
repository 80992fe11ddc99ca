import type { Metadata } from 'next';
import { redirect } from 'next/navigation';

import { readOnServer, viewer } from '@/app/_kit/prefetch';
import { workFor } from '@/app/_kit/sign-in';
import { OneButtonForm } from '@/components/people/one-button-form';
import { PublicPage } from '@/components/people/public-page';
import { getAccountEndpoint } from '@/lib/people/endpoints';
import { safeNext } from '@/lib/people/safe-next';

export const metadata: Metadata = { title: 'For whom do you work today?' };

export default async function OrganisationPage({
  searchParams,
}: {
  searchParams: Promise<{ next?: string }>;
}) {
  const next = safeNext((await searchParams).next);
  if ((await viewer()).actor.kind !== 'person') redirect(`/sign-in?next=${encodeURIComponent(next)}`);
  const { organisations } = await readOnServer(getAccountEndpoint, {});
  return (
    <PublicPage
      title="For whom do you work today?"
      lead="What you see and do belongs to one of them at a time."
    >
      {organisations.map(({ membershipId, name, roles }) => (
        <OneButtonForm
          key={membershipId}
          action={workFor}
          fields={{ membershipId, next }}
          look="outlined"
          busyLabel="Opening"
        >
          {`${name}, as ${roles.join(', ')}`}
        </OneButtonForm>
      ))}
    </PublicPage>
  );
}
