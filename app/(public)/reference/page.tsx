import { redirect } from 'next/navigation';

import { FIRST_SUBJECT } from '@/components/reference/subjects';

export default function BenchReference() {
  redirect(`/reference/${FIRST_SUBJECT}`);
}
