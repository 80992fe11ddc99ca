export interface SectionLink {
  says: string;
  href: string;
  /** Pressed after `G`. */
  letter?: string | undefined;
  /** What waits for me there. */
  count?: number | undefined;
  /** Addresses that belong to it too. */
  also?: readonly string[] | undefined;
}

const SHOP_SECTIONS = [
  { key: 'tideline', says: 'Tideline', href: '/', letter: 'T' },
  { key: 'batches', says: 'Batches', href: '/batches', letter: 'B' },
  { key: 'lots', says: 'Parts and lots', href: '/lots', letter: 'L', also: ['/parts'] },
  {
    key: 'certificates',
    says: 'Certificates',
    href: '/certificates',
    letter: 'C',
    also: ['/nonconformances'],
  },
  { key: 'invoices', says: 'Invoices', href: '/invoices', letter: 'I' },
  { key: 'stock', says: 'Stock', href: '/stock', letter: 'S' },
  { key: 'assemblies', says: 'Assemblies', href: '/assemblies', letter: 'A' },
  { key: 'processors', says: 'Processors', href: '/processors', letter: 'P' },
  { key: 'reference', says: 'Bench reference', href: '/reference', letter: 'R' },
] as const;

const SETTINGS: SectionLink = {
  says: 'Settings',
  href: '/settings',
  also: ['/audit', '/jobs', '/api-docs'],
};

export type ShopSection = (typeof SHOP_SECTIONS)[number]['key'];

/** The words in the head of the shop's side; settings only for those who may change them. */
export function shopSections(
  roles: readonly string[],
  counts: Partial<Record<ShopSection, number>> = {},
): SectionLink[] {
  const sections = SHOP_SECTIONS.map((section): SectionLink => ({ ...section, count: counts[section.key] }));
  return roles.includes('admin') ? [...sections, SETTINGS] : sections;
}

/** The section a page belongs to: the one with the longest address it begins with. */
export function sectionOf(path: string, sections: readonly SectionLink[]): SectionLink | undefined {
  const begins = (start: string) =>
    start === '/' ? path === '/' : path === start || path.startsWith(`${start}/`);
  const lengthIn = ({ href, also = [] }: SectionLink) =>
    Math.max(0, ...[href, ...also].filter(begins).map((start) => start.length));
  return sections
    .filter((section) => lengthIn(section) > 0)
    .sort((one, other) => lengthIn(other) - lengthIn(one))[0];
}
