import type { StatedCertificate } from '../certificate';
import type { Check } from './compared';
import { soakOutcomes, temperatureOutcomes } from './cycle-checks';
import { minutesBetween } from './duration';
import { cannotTell, meets, notStated, wrong, type Outcome } from './outcome';
import { speaksOf } from './on-the-page';
import { sideOf } from './range';
import { sayDuration, sayMinute } from './say';

const NAMES = /^\W*(?:bak(?:e|ed|ing)|embrittlement|h\.?e\.?r|entspr|degazage|dégazage)/i;

const isBake = ({ step }: { step: string }) => step === 'embrittlement_relief' || step === 'bake';

/** Parts that plating may have embrittled were baked: soon enough, hot enough, as long as they must be. */
export const isBaked: Check = ({ stated, order, pages }) => {
  const { bake } = order.requirements;
  if (!bake) return [];
  const cycles = bakesOf(stated);
  const least = bake.min_hours === undefined ? '' : ` ${bake.min_hours} h`;
  const asked = { requirement: `bake${least} after plating`, ordered: `bake${least}` };
  if (cycles.length === 0 && speaksOf(NAMES, [bake.set_f ?? NaN, bake.min_hours ?? NaN], pages))
    return [cannotTell(asked, 'The page speaks of a bake that could not be read.')];
  if (cycles.length === 0)
    return [
      wrong(
        'bake_missing',
        asked,
        `The order asks for a bake${least ? ` of${least}` : ''} after plating; the certificate states none.`,
      ),
    ];
  return [
    ...(bake.set_f === undefined
      ? []
      : temperatureOutcomes('bake', { set_f: bake.set_f, tolerance_f: bake.tolerance_f ?? 0 }, cycles)),
    ...(bake.min_hours === undefined
      ? []
      : soakOutcomes('bake', { min: bake.min_hours * 60 }, cycles, {
          short: 'bake_too_short',
          long: 'bake_too_short',
        })),
    ...(bake.max_hours_after_plating === undefined
      ? []
      : [startOutcome(bake.max_hours_after_plating, stated.plating_end, cycles[0]?.soak_start ?? null)]),
  ];
};

/** The certificate's own start and end complete the first bake that is listed. */
function bakesOf({ cycles, bake_start, bake_end }: StatedCertificate): StatedCertificate['cycles'] {
  const [listed, ...further] = cycles.filter(isBake);
  if (!listed && bake_start === null && bake_end === null) return [];
  const none = { step: 'embrittlement_relief', set_temp: null, unit: null, minutes: null };
  const first = listed ?? { ...none, soak_start: null, soak_end: null };
  return [
    { ...first, soak_start: bake_start ?? first.soak_start, soak_end: bake_end ?? first.soak_end },
    ...further,
  ];
}

function startOutcome(mostHours: number, platingEnd: string | null, start: string | null): Outcome {
  const limit = `≤ ${mostHours} h after plating`;
  const asked = { requirement: `bake started ${limit}`, ordered: limit };
  if (platingEnd === null || start === null)
    return notStated(asked, 'The end of plating or the start of the bake is not stated.');
  const minutes = minutesBetween(platingEnd, start);
  const says = { ...asked, stated: `${sayMinute(platingEnd)}, bake ${sayMinute(start)}` };
  if (minutes < 0)
    return wrong(
      'time_arithmetic',
      says,
      `The bake starts ${sayMinute(start)}, before plating ended ${sayMinute(platingEnd)}.`,
      'check',
    );
  return sideOf(minutes, { max: mostHours * 60 }) === 'within'
    ? meets(says, `The bake started ${sayDuration(minutes)} after plating ended.`)
    : wrong(
        'bake_started_late',
        says,
        `The bake started ${sayDuration(minutes)} after plating ended; the order allows ${mostHours} h.`,
      );
}
