import type { Metadata } from 'next';

import { MailMeForm } from '@/components/people/mail-me-form';
import { PublicPage } from '@/components/people/public-page';

export const metadata: Metadata = { title: 'Choose a new password' };

export default function ForgottenPage() {
  return (
    <PublicPage
      title="Choose a new password"
      lead="A link comes by mail. The password you have now holds until you choose another."
    >
      <MailMeForm for="reset" />
    </PublicPage>
  );
}
