import { momentWords } from '@/lib/day-words';

import { ALWAYS_WITH_YEAR } from './evidence-words';

/** `Fri 17 Apr 2026 07:12` in the shop's zone. */
export function When({ at, zone }: { at: string; zone: string }) {
  return (
    <time dateTime={at} className="num whitespace-nowrap">
      {momentWords(new Date(at), { zone, now: ALWAYS_WITH_YEAR })}
    </time>
  );
}
