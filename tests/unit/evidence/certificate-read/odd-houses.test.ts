import { expect, test } from 'vitest';
import { statedIn } from '@/lib/evidence/certificate/read/read-certificate';
import { MORE_ODD_HOUSES } from './more-odd-houses';
import { ODD_HOUSES } from './odd-houses';
import { fileOf, pageOf } from './page-of-text';
import { STILL_MORE_ODD_HOUSES } from './still-more-odd-houses';
import { told } from './told';

const linesOf = (text: string): string[] => text.split('\n').slice(1);

test.each([...ODD_HOUSES, ...MORE_ODD_HOUSES, ...STILL_MORE_ODD_HOUSES])(
  '$name',
  ({ page, told: expected }) => {
    const [stated] = statedIn(fileOf(pageOf(linesOf(page))));
    if (!stated) throw new Error('nothing was read');
    const wanted = linesOf(expected).slice(0, -1);
    const isListed = /^(?:part|cycle|readings) \|/;
    const fields = new Set(wanted.map((line) => line.split(':')[0]));
    const read = told(stated).filter((line) => isListed.test(line) || fields.has(line.split(':')[0]));
    expect(read).toEqual(wanted);
  },
);
