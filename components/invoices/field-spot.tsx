'use client';
import { SpotPicture } from '@/components/certificates/spot-picture';

import type { InvoiceSpots } from './use-invoice-spots';

/** The spot of the field that is chosen, enlarged; it stays in sight however long the form is. */
export function FieldSpot({ spots: { read, selected, fact, page, drawn } }: { spots: InvoiceSpots }) {
  if (read?.state !== 'read') return null;
  return (
    <div className="sticky top-0 z-10 flex min-h-[80px] items-center gap-4 bg-paper py-2 text-second">
      {fact && page ? (
        <>
          <SpotPicture fact={fact} page={page} drawn={drawn} />
          <span className="text-quiet">
            page <span className="num">{fact.page}</span>
          </span>
        </>
      ) : (
        <p className="text-quiet">
          {selected === null
            ? 'Choose a field to see where it stands on the page. A word pressed on the page goes into the field.'
            : 'It was not found on the page.'}
        </p>
      )}
    </div>
  );
}
