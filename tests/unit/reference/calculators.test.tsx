import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { CALCULATORS } from '@/components/reference/calculators';
import { SUBJECTS, type Subject } from '@/components/reference/subjects';

const NAMES = Object.keys(SUBJECTS) as Subject[];
/** What is seen: no markup, no values of fields. */
const seen = (markup: string): string => markup.replace(/<[^>]*>/g, ' ');

test.each(NAMES)('%s shows its title, a source and no raw code', (subject) => {
  const text = seen(renderToStaticMarkup(createElement(CALCULATORS[subject], { given: {} })));
  expect(text).toContain(SUBJECTS[subject]);
  expect(text).toMatch(/trust/);
  expect(text).not.toMatch(/[a-z]+_[a-z]+|undefined|NaN/);
});

test.each(NAMES)('%s stands when its fields hold anything', (subject) => {
  const given = new Proxy({}, { get: (_, name) => (name === 'units' ? 'metric' : 'x?') });
  const text = seen(renderToStaticMarkup(createElement(CALCULATORS[subject], { given })));
  expect(text).not.toMatch(/[a-z]+_[a-z]+|undefined|NaN/);
});
