import type { Metadata } from 'next';

import { NewProcessorScreen } from '@/components/processors/new-processor-screen';

export const metadata: Metadata = { title: 'Add a processor' };

export default function NewProcessorPage() {
  return <NewProcessorScreen />;
}
