import type { Metadata } from 'next';
import { notFound } from 'next/navigation';

import { BenchPage } from '@/components/reference/bench-page';
import { CALCULATORS } from '@/components/reference/calculators';
import { isSubject, SUBJECTS } from '@/components/reference/subjects';

interface BenchProps {
  params: Promise<{ subject: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export async function generateMetadata({ params }: BenchProps): Promise<Metadata> {
  const { subject } = await params;
  return { title: isSubject(subject) ? SUBJECTS[subject] : 'Bench reference' };
}

export default async function BenchReferencePage({ params, searchParams }: BenchProps) {
  const { subject } = await params;
  if (!isSubject(subject)) notFound();
  const Calculator = CALCULATORS[subject];
  const given = Object.fromEntries(
    Object.entries(await searchParams).map(([name, value]) => [
      name,
      Array.isArray(value) ? value[0] : value,
    ]),
  );
  return (
    <BenchPage subject={subject}>
      <Calculator key={subject} given={given} />
    </BenchPage>
  );
}
