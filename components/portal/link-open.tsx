import { BatchTag } from '@/components/ui/tag';
import { Button, ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/edge';
import { dayWords } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';
import type { LinkFace } from '@/lib/portal/link-contract';

interface LinkOpenProps {
  batch: NonNullable<LinkFace['batch']>;
  now: Date;
  /** Where the button sends its form; a plain one, so that it works before or without any script. */
  action: string;
  /** Part of the page to open at. */
  at?: string | undefined;
  /** The address for who is signed in here already and may see the batch without the link. */
  straightTo?: string | undefined;
  /** Who is signed in here and would be signed out: "Ines Halloran, Heron Reach Floatworks". */
  signedInAs?: string | undefined;
}

/** What a mailed link is for, and one button. */
export function LinkOpen({ batch, now, action, at, straightTo, signedInAs }: LinkOpenProps) {
  const clock = { zone: batch.zone, now };
  return (
    <>
      <BatchTag size="phone" stage={batch.stage} number={batch.number} />
      <h1 className="pt-2.5 text-[1.4375rem] leading-[1.6875rem] text-balance">
        {batch.pieces.toLocaleString('en-US')} {batch.pieces === 1 ? 'piece' : 'pieces'}:{' '}
        {PROCESS_WORDS[batch.process]}
      </h1>
      <p className="pt-1 text-quiet">
        {batch.specification}. Order <span className="num text-ink">{batch.orderNumber}</span> of {batch.shop}
        . For you, <strong className="text-ink">{batch.processor}</strong>.
        {batch.wantedBackOn !== null && <> Wanted back by {dayWords(batch.wantedBackOn, clock)}.</>}
      </p>
      {straightTo === undefined ? (
        <form method="post" action={action} className="pt-5">
          {at !== undefined && <input type="hidden" name="at" value={at} />}
          {signedInAs !== undefined && (
            <Caution>This device is signed in as {signedInAs}. Opening the link ends that here.</Caution>
          )}
          <Button type="submit" look="primary" size="big" className="w-full">
            Open {batch.number}
          </Button>
        </form>
      ) : (
        <div className="pt-5">
          <ButtonLink look="primary" size="big" href={straightTo} className="w-full">
            Open {batch.number}
          </ButtonLink>
        </div>
      )}
      <p className="pt-4 text-second leading-5 text-quiet">
        No password is needed. The link opens this batch and nothing else, as often as you like, on this
        device and on others, until the batch is settled or {batch.shop} withdraws it.
      </p>
    </>
  );
}
