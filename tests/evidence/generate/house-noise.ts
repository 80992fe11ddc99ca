import type { Dice } from './dice';

/** A telephone number of the range that is kept free for stories. */
export const telephone = (dice: Dice): string =>
  `(${dice.whole(201, 989)}) 555-01${String(dice.whole(0, 99)).padStart(2, '0')}`;

/** What stands at the foot of a form and says nothing of this batch. */
export const formFoot = (dice: Dice): string =>
  `Form QF-${dice.whole(10, 99)}-${dice.whole(1, 9)} Rev ${dice.pick(['C', 'E', 'G', 'K'])} (${dice.pick(['01/19', '06/22', '11/2023'])})`;

export const approvals = (dice: Dice): string =>
  `AS9100D / ISO 9001:2015 Registered, Cert. No. ${dice.whole(10000, 99999)}  •  Nadcap accredited HT, CP, NDT  •  Repair Station ${dice.pick(['Q', 'K', 'T'])}${dice.whole(1, 9)}${dice.pick(['XR', 'BM', 'LD'])}${dice.whole(100, 999)}Y`;
