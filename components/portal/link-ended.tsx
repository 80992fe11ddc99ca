import type { ReactNode } from 'react';

import { PublicPage } from '@/components/people/public-page';
import { BatchTag } from '@/components/ui/tag';
import type { LinkFace } from '@/lib/portal/link-contract';

/** A link that opens nothing any more: why, and what one can do. */
export function LinkEnded({ state, batch }: LinkFace) {
  if (batch === null || state === 'unknown' || state === 'open') {
    return (
      <PublicPage title="This is not a link of ours">
        <p>
          Perhaps it was cut when it was copied. Open it from the mail itself, or ask the shop that sent you
          the parts for a new one.
        </p>
        <SignIn />
      </PublicPage>
    );
  }
  const { says, todo } = WORDS[state](batch);
  return (
    <PublicPage tag={<BatchTag size="phone" stage={batch.stage} number={batch.number} />} title={says}>
      <p>
        {todo} <Ring {...batch} />
      </p>
      <SignIn />
    </PublicPage>
  );
}

type Batch = NonNullable<LinkFace['batch']>;

const WORDS: Record<
  'withdrawn' | 'settled' | 'cancelled',
  (batch: Batch) => { says: string; todo: ReactNode }
> = {
  withdrawn: ({ shop, number }) => ({
    says: `${shop} has withdrawn this link`,
    todo: `Look for a later mail about ${number}; it may carry a new one. Otherwise ask the shop to send it.`,
  }),
  settled: ({ number, shop }) => ({
    says: `${number} is settled`,
    todo: `Its papers are accepted and its invoice is paid, so the link has ended. If something is still open, write to ${shop}.`,
  }),
  cancelled: ({ number, shop }) => ({
    says: `${shop} has cancelled ${number}`,
    todo: 'Do not work on it. Its pieces go back to the shop as they are.',
  }),
};

function Ring({ shop, shopPhone }: Batch) {
  if (shopPhone === null) return null;
  return (
    <a className="lw-word-button" href={`tel:${shopPhone.replaceAll(/[^+\d]/g, '')}`}>
      Call {shop}, {shopPhone}
    </a>
  );
}

function SignIn() {
  return (
    <p className="text-second leading-5 text-quiet">
      People of the processor who have an account see all their batches after they{' '}
      <a href="/sign-in">sign in</a>.
    </p>
  );
}
