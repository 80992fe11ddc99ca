import { PublicPage } from '@/components/people/public-page';
import { dayWords } from '@/lib/day-words';
import type { DossierLinkFace } from '@/lib/dossiers/contract';

import { ALWAYS_WITH_YEAR } from './evidence-words';

/** A link that opens nothing any more: which way it ended, and what one can do. */
export function DossierLinkEnded({ state, shop, phone, zone, endedAt }: DossierLinkFace) {
  const day =
    endedAt === null ? null : dayWords(new Date(endedAt), { zone: zone ?? 'UTC', now: ALWAYS_WITH_YEAR });
  const name = shop ?? 'The shop';
  if (state === 'withdrawn')
    return (
      <Words
        says={`${name} has withdrawn this link`}
        todo={`It opened a dossier until ${day ?? 'then'}. If you still need it, ask ${name} for a new one.`}
        phone={phone}
        shop={name}
      />
    );
  if (state === 'ended')
    return (
      <Words
        says="This link has ended"
        todo={`It opened a dossier of ${name} until ${day ?? 'then'}. If you still need it, ask for a new one.`}
        phone={phone}
        shop={name}
      />
    );
  return (
    <Words
      says="This is not a link of ours"
      todo="Perhaps it was cut when it was copied. Open it from the mail itself, or ask the shop that sent it for a new one."
      phone={null}
      shop={name}
    />
  );
}

function Words({
  says,
  todo,
  phone,
  shop,
}: {
  says: string;
  todo: string;
  phone: string | null;
  shop: string;
}) {
  return (
    <PublicPage title={says}>
      <p>
        {todo}{' '}
        {phone !== null && (
          <a className="lw-word-button" href={`tel:${phone.replaceAll(/[^+\d]/g, '')}`}>
            Call {shop}, {phone}
          </a>
        )}
      </p>
    </PublicPage>
  );
}
