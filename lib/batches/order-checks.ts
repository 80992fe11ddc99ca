import { dayWords, daysUntil } from '@/lib/day-words';

import type { Check } from './check';
import type { WayOut } from './finding';

export const hasDay: Check = {
  met: 'the day you want it back is said and ahead',
  look(facts) {
    const { wantedBackOn } = facts.batch;
    const waysOut: WayOut[] = [{ way: 'set_days', says: 'Set the day' }];
    if (wantedBackOn === null)
      return [
        {
          code: 'no_wanted_day',
          level: 'warn',
          subject: '',
          sentence: 'No day is asked for.',
          rest: 'The processor will not know when you want the pieces back.',
          waysOut,
        },
      ];
    if (daysUntil(wantedBackOn, facts) > 0) return [];
    return [
      {
        code: 'wanted_day_past',
        level: 'warn',
        subject: '',
        sentence: 'The day you want it back is here.',
        rest: `It says ${dayWords(wantedBackOn, facts)}.`,
        waysOut,
      },
    ];
  },
};

export const hasPrice: Check = {
  met: 'the order states prices',
  look({ batch, lines }) {
    const waysOut: WayOut[] = [{ way: 'set_prices', says: 'Set prices' }];
    const unpriced = lines.filter((line) => line.unitPriceMinor === 0);
    if (unpriced.length === 0) return [];
    if (unpriced.length < lines.length) {
      const numbers = unpriced.map((line) => line.lineNo).join(', ');
      return [
        {
          code: 'line_without_price',
          level: 'note',
          subject: '',
          sentence: `${unpriced.length === 1 ? `Line ${numbers} has` : `Lines ${numbers} have`} no price.`,
          rest: 'The order counts them as nothing.',
          waysOut,
        },
      ];
    }
    if (batch.lotMinimumMinor > 0) return [];
    return [
      {
        code: 'no_price',
        level: 'warn',
        subject: '',
        sentence: 'The order states no price.',
        rest: 'An invoice will have nothing to be compared with.',
        waysOut,
      },
    ];
  },
};

export const isTakenUp: Check = {
  met: 'it is not put aside',
  look: (facts) =>
    facts.batch.putAsideAt === null
      ? []
      : [
          {
            code: 'put_aside',
            level: 'note',
            subject: '',
            sentence: `It was put aside ${dayWords(facts.batch.putAsideAt, facts)}.`,
            rest: 'Dispatching it takes it up again.',
            waysOut: [{ way: 'take_up', says: 'Take it up' }],
          },
        ],
};
