import type { Recording } from './recording';
import { writtenTimeIn } from './written-time';

const DELAY =
  /(?:quench|transfer)[\s_-]*(?:delay|time)?[^\d\n]{0,20}?(\d+(?:[.,]\d+)?)\s*(?:s|sec|seconds?|sek)\b/i;
const DOOR_OPENS =
  /door[^a-z]*open|open[a-z]*[^a-z]*door|t[üu]r[^a-z]*(?:auf|offen|öffnet)|porte[^a-z]*ouver/i;
const IN_LIQUID =
  /immers|submerg|in(?:to)? (?:the )?(?:quench|tank|water)|quench(?:ed)?[^a-z]*(?:start|begin|on|in|tank|level|down)?\s*$|abgeschreckt|abschreck|eingetaucht/i;
/** Between door and liquid there are seconds, never an hour. */
const LONGEST_S = 3600;

/**
 * The quench delay in seconds, where the recorder's own remarks say it: a line `Quench delay: 8 s`, or events with their
 * times, the door opening and the load in the liquid. Null where they do not.
 */
export function statedDelay({ remarks }: Pick<Recording, 'remarks'>): number | null {
  for (const remark of remarks) {
    const stated = /max|limit|allow/i.test(remark) ? null : DELAY.exec(remark);
    if (stated?.[1] !== undefined && /delay|transfer/i.test(remark))
      return Number.parseFloat(stated[1].replace(',', '.'));
  }
  const [opens, dips] = [DOOR_OPENS, IN_LIQUID].map((words) => eventTime(remarks, words));
  if (opens == null || dips == null) return null;
  const delay = dips - opens;
  return delay >= 0 && delay < LONGEST_S ? delay : null;
}

/** Seconds of the day of the last remark of an event. */
function eventTime(remarks: readonly string[], words: RegExp): number | null {
  const remark = remarks.findLast((line) => words.test(line.replace(/["\s;,|]+$/, '')));
  const time = remark && /\d{1,2}:\d\d:\d\d(?:\s?[ap]\.?m)?/i.exec(remark)?.[0];
  return (time === undefined || time === '' ? null : writtenTimeIn(time)?.seconds) ?? null;
}
