import { describe, expect, test } from 'vitest';
import { sectionOf, shopSections } from '@/components/shell/sections';

const wordOf = (path: string) => sectionOf(path, shopSections(['admin']))?.says;

describe('the section a page belongs to', () => {
  test.each([
    ['/', 'Tideline'],
    ['/batches', 'Batches'],
    ['/batches/0199/prove', 'Batches'],
    ['/parts/0199', 'Parts and lots'],
    ['/nonconformances/0199', 'Certificates'],
    ['/audit', 'Settings'],
    ['/batchesque', undefined],
  ])('%s is in %s', (path, expected) => expect(wordOf(path)).toBe(expected));
});

test('settings are for the admin', () => {
  expect(shopSections(['lead']).map((section) => section.says)).not.toContain('Settings');
  expect(shopSections(['lead', 'admin']).map((section) => section.says)).toContain('Settings');
});

test('of two sections whose addresses fit, the longer one is open', () => {
  const sections = [
    { says: 'Work', href: '/portal' },
    { says: 'Account', href: '/portal/account' },
  ];
  expect(sectionOf('/portal/account', sections)?.says).toBe('Account');
  expect(sectionOf('/portal/batches/0199', sections)?.says).toBe('Work');
});
