import Link from 'next/link';
import type { ReactNode } from 'react';

import { Caution } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';

import { SUBJECTS, type Subject } from './subjects';

/** The bench reference: the list of calculators, the one that is open, and what all of them are worth. */
export function BenchPage({ subject, children }: { subject: Subject; children: ReactNode }) {
  return (
    <>
      <PageHead
        title="Bench reference"
        sub="Works without an account. Every number shows where it comes from. None of it releases a part."
      />
      <div className="grid grid-cols-1 gap-x-gutter gap-y-4 lg:grid-cols-[14rem_minmax(0,1fr)]">
        <nav aria-label="Calculators" className="print:hidden">
          <ul className="flex flex-wrap gap-x-5 border-rule lg:block lg:border-l-2">
            {Object.entries(SUBJECTS).map(([slug, says]) => (
              <li key={slug}>
                <Link
                  href={`/reference/${slug}`}
                  aria-current={slug === subject ? 'page' : undefined}
                  className={`flex min-h-9 items-center font-cond text-word no-underline lg:-ml-0.5 lg:pl-3 touch:min-h-12 ${
                    slug === subject
                      ? 'text-ink max-lg:underline lg:border-l-4 lg:border-ink lg:pl-2.5'
                      : 'font-medium text-quiet'
                  }`}
                >
                  {says}
                </Link>
              </li>
            ))}
          </ul>
        </nav>
        <div className="min-w-0">
          {children}
          <Caution>
            Reference values only. The drawing, the contract and the governing specification at its invoked
            revision decide; heat treatment, plating and inspection belong to approved processors and
            qualified people, under the local rules.
          </Caution>
        </div>
      </div>
    </>
  );
}
