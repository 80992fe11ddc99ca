import type { Metadata } from 'next';

import { MailMeForm } from '@/components/people/mail-me-form';
import { PublicPage } from '@/components/people/public-page';
import { safeNext } from '@/lib/people/safe-next';

export const metadata: Metadata = { title: 'Sign in by mail' };

export default async function MailMePage({ searchParams }: { searchParams: Promise<{ next?: string }> }) {
  return (
    <PublicPage title="Sign in by mail" lead="No password needed: a link that signs you in once.">
      <MailMeForm for="sign_in" next={safeNext((await searchParams).next)} />
    </PublicPage>
  );
}
