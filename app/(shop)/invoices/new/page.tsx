import type { Metadata } from 'next';

import { TakeUpScreen } from '@/components/invoices/take-up-screen';

export const metadata: Metadata = { title: 'Take up an invoice' };

export default function TakeUpPage() {
  return <TakeUpScreen />;
}
