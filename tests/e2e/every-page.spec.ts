import type { APIRequestContext } from '@playwright/test';

import { SUBJECTS } from '@/components/reference/subjects';

import { expect, test } from './support/journey';
import { fitsTheWindow, looksRight } from './support/look';

interface Row {
  id: string;
}

/** What the addresses of single things are made from: the newest of each kind that the person may see. */
const NEWEST = {
  part: '/parts',
  lot: '/lots',
  batch: '/batches',
  building: '/batches?stage=building',
  back: '/batches?stage=returned',
  certificate: '/certificates',
  nonconformance: '/nonconformances',
  invoice: '/invoices',
  assembly: '/assemblies',
  processor: '/processors',
} as const;
type Kind = keyof typeof NEWEST;

const LEAD = [
  '/',
  '/parts',
  '/parts/new',
  '/parts/{part}',
  '/parts/{part}/edit',
  '/parts/{part}/revise',
  '/lots',
  '/lots/new',
  '/lots/import',
  '/lots/{lot}',
  '/lots/{lot}/dossier',
  '/batches',
  '/batches/new',
  '/batches/{batch}',
  '/batches/{building}',
  '/batches/{batch}/traveller',
  '/batches/{batch}/labels',
  '/batches/{batch}/reissue',
  '/processors',
  '/processors/{processor}',
  '/assemblies',
  '/assemblies/new',
  '/assemblies/{assembly}',
  '/assemblies/{assembly}/edit',
  '/stock',
  '/stock/places',
  '/settings/account',
  '/settings/tokens',
  '/settings/tables',
  '/settings/tables/quench-delays',
  '/settings/tables/ordering-information',
  '/api-docs',
];
const INSPECTOR = [
  '/',
  '/receive',
  '/batches/{back}/receive',
  '/batches/{back}/release',
  '/certificates',
  '/certificates/{certificate}',
  '/nonconformances',
  '/nonconformances/{nonconformance}',
];
const OFFICE = ['/', '/invoices', '/invoices/new', '/invoices/{invoice}', '/invoices/{invoice}?enter=1'];
const ADMIN = [
  '/settings',
  '/settings/shop',
  '/settings/people',
  '/settings/payments',
  '/processors/new',
  '/audit',
  '/jobs',
];
const PROCESSOR = ['/portal', '/portal?show=finished', '/portal/account'];
const NOBODY = [
  '/sign-in',
  '/sign-in/forgotten',
  '/sign-in/link',
  '/invitation/no-such-token',
  '/reset/no-such-token',
  '/sign-in-link/no-such-token',
  '/b/no-such-token',
  '/d/no-such-token',
];

const WALKS = [
  { name: 'Lead', email: 'liv@merganser.test', pages: LEAD },
  { name: 'Inspector', email: 'amos@merganser.test', pages: INSPECTOR },
  { name: 'Office', email: 'petra@merganser.test', pages: OFFICE },
  { name: 'Admin', email: 'jun@merganser.test', pages: ADMIN },
  { name: 'Auditor', email: 'ada@merganser.test', pages: ['/', '/batches/{batch}', '/audit'] },
  { name: 'Processor', email: 'desk@galena-thermal.test', pages: PROCESSOR },
  { name: 'Nobody', email: null, pages: NOBODY },
  { name: 'Bench', email: null, pages: Object.keys(SUBJECTS).map((subject) => `/reference/${subject}`) },
] as const;

/** Day at a desk and on a phone, night on a tablet; the contrast of both palettes is reckoned in a test of its own. */
const VIEWS = [
  { width: 1440, height: 900, colorScheme: 'light', look: looksRight },
  { width: 820, height: 1100, colorScheme: 'dark', look: fitsTheWindow },
  { width: 390, height: 844, colorScheme: 'light', look: fitsTheWindow },
] as const;

for (const { name, email, pages } of WALKS) {
  test(`${name}: nothing serious on any page, and nothing said to the console, at every width`, async ({
    person,
  }) => {
    test.setTimeout(600_000);
    const walker = await person(name);
    const { page } = walker;
    const said: string[] = [];
    page.on('pageerror', (error) => said.push(`${page.url()}: ${error.message}`));
    page.on('console', (line) => {
      // That an ended link or an unknown address is answered with 404 is said by the browser itself.
      const isStatus = line.text().startsWith('Failed to load resource');
      if (line.type() === 'error' && !isStatus) said.push(`${page.url()}: ${line.text()}`);
    });
    if (email !== null) await walker.signIn(email);
    for (const path of pages) {
      await page.setViewportSize(VIEWS[0]);
      await page.goto(await addressOf(path, page.request));
      for (const { colorScheme, look, ...size } of VIEWS) {
        await page.setViewportSize(size);
        await page.emulateMedia({ colorScheme });
        await look(page, `every/${name.toLowerCase()}${fileNameOf(path)}-${size.width}`);
      }
    }
    expect(said, 'what the pages said to the console').toEqual([]);
  });
}

async function addressOf(path: string, request: APIRequestContext): Promise<string> {
  const kind = /\{(\w+)\}/.exec(path)?.[1] as Kind | undefined;
  if (kind === undefined) return path;
  const answer = await request.get(`/api${NEWEST[kind]}`);
  const { rows } = (await answer.json()) as { rows: Row[] };
  const [newest] = rows;
  if (!newest) throw new Error(`The demonstration has no ${kind} to look at.`);
  return path.replace(/\{\w+\}/, newest.id);
}

const fileNameOf = (path: string): string => path.replace(/\W+/g, '-').replace(/-$/, '') || '-first';
