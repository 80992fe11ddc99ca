import Link from 'next/link';

import { Section } from '@/components/ui/section';

/** What holds for every call. */
export function Preface({ address }: { address: string }) {
  return (
    <Section title="What holds for all">
      <ul className="flex max-w-[46rem] list-disc flex-col gap-1.5 pt-1 pl-5">
        <li>
          The address is <span className="num">{address}/api</span>. The same as a file for programs:{' '}
          <a href="/api/openapi.json">openapi.json</a>, OpenAPI 3.1.
        </li>
        <li>
          A program shows who it is with <span className="num">Authorization: Bearer lw_…</span>. Make such a
          token under <Link href="/settings/tokens">Tokens for programs</Link>; it may do at most what its
          owner may.
        </li>
        <li>Reads are GET with the query in the address; all else carries one JSON object.</li>
        <li>
          A write may carry <span className="num">Idempotency-Key</span>. The same key with the same body
          happens once and gets the same answer; with another body it is refused with 409.
        </li>
        <li>
          A refusal is <span className="num">application/problem+json</span>:{' '}
          <span className="num">title</span> is the sentence for the person,{' '}
          <span className="num">fields</span> names what is wrong where,{' '}
          <span className="num">requestId</span> finds it in the log.
        </li>
        <li>
          A thing with <span className="num">version</span> is saved with the version that was read. 409 means
          somebody saved first: read again.
        </li>
        <li>
          Lists answer <span className="num">rows</span> and <span className="num">next</span>; ask again with{' '}
          <span className="num">after</span> set to it until it is null.
        </li>
      </ul>
    </Section>
  );
}
