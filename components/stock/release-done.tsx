import Link from 'next/link';

import { ButtonLink } from '@/components/ui/button';
import { VerdictMark } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';

export interface Released {
  /** `25 of L-0219, FL-4431-07 Chine angle, to C-14` */
  moved: readonly string[];
  releaseIds: readonly string[];
  assemblies: readonly { id: string; name: string; ready: number; needed: number }[];
}

/** What moved by the press just now: pieces, and how much nearer it brought an assembly. */
export function ReleaseDone({ batchId, released }: { batchId: string; released: readonly Released[] }) {
  const ids = released.flatMap((one) => one.releaseIds);
  // Released twice in a row, an assembly stands as the last press left it.
  const assemblies = [
    ...new Map(released.flatMap((one) => one.assemblies).map((one) => [one.id, one])).values(),
  ];
  return (
    <div role="status" className="pb-5">
      <Section
        title="Released just now"
        action={
          <ButtonLink size="small" href={`/batches/${batchId}/labels?of=${ids.join(',')}`}>
            {ids.length === 1 ? 'Print the label' : `Print ${ids.length} labels`}
          </ButtonLink>
        }
      >
        <ul>
          {released
            .flatMap((one) => one.moved)
            .map((says, at) => (
              <li key={at} className="flex items-start gap-2 border-b border-rule py-1.5">
                <VerdictMark verdict="meets" size={13} className="mt-1 text-proved-ink" />
                {says}
              </li>
            ))}
          {assemblies.map((one) => (
            <li key={one.id} className="border-b border-rule py-1.5 pl-[21px]">
              <Link href={`/assemblies/${one.id}`} className="font-cond text-word">
                {one.name}
              </Link>{' '}
              now has <strong className="num">{one.ready}</strong> of{' '}
              <span className="num">{one.needed}</span>
              {one.ready >= one.needed && ': all it needs'}
            </li>
          ))}
        </ul>
      </Section>
    </div>
  );
}
