import { ALLOYS, type Alloy } from '@/lib/trade/alloys/alloy';
import { PRODUCT_FORMS, type ProductForm } from '@/lib/trade/process';
import { TEMPERS, type Temper } from '@/lib/trade/tempers/temper';

/** Words of a file of values as the words of the program; a word that it does not have fails the test. */
export const alloyOf = (word: string): Alloy => oneOf(word, (known): known is Alloy => known in ALLOYS);

export const formOf = (word: string): ProductForm =>
  oneOf(word, (known): known is ProductForm => PRODUCT_FORMS.some((form) => form === known));

export const temperOf = (word: string): Temper =>
  oneOf(word, (known): known is Temper => TEMPERS.some((temper) => temper === known));

function oneOf<Word extends string>(word: string, isKnown: (word: string) => word is Word): Word {
  if (!isKnown(word)) throw new Error(`"${word}" is no word of the program`);
  return word;
}
