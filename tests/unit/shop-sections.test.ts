import { describe, expect, test } from 'vitest';
import { isInSection, shopSections } from '@/components/shell/sections';

const sectionOf = (path: string) =>
  shopSections(['admin'])
    .filter((section) => isInSection(path, section))
    .map((s) => s.says);

describe('the section a page belongs to', () => {
  test.each([
    ['/', ['Tideline']],
    ['/batches', ['Batches']],
    ['/batches/0199/prove', ['Batches']],
    ['/parts/0199', ['Parts and lots']],
    ['/nonconformances/0199', ['Certificates']],
    ['/audit', ['Settings']],
    ['/batchesque', []],
  ])('%s is in %o', (path, expected) => expect(sectionOf(path)).toEqual(expected));
});

test('settings are for the admin', () => {
  expect(shopSections(['lead']).map((section) => section.says)).not.toContain('Settings');
  expect(shopSections(['lead', 'admin']).map((section) => section.says)).toContain('Settings');
});
