import { createHash } from 'node:crypto';

import { unzipSync } from 'fflate';

import { expect, type Person } from '../support/journey';

const FEWEST_FILES = 5;

/** Makes document and archive from the screen, fetches the archive and checks every file against its manifest. */
export async function makeAndVerifyDossier(inspector: Person, lotId: string): Promise<void> {
  const { page } = inspector;
  await inspector.goTo(`/lots/${lotId}/dossier`);
  await inspector.press(page.getByRole('button', { name: 'Make document and archive' }));
  const archive = page.getByRole('link', { name: 'Archive, ZIP' });
  await inspector.sees(archive);
  await inspector.looks('dossier');
  const download = await page.request.get((await archive.getAttribute('href')) ?? '');
  const files = unzipSync(new Uint8Array(await download.body()));
  const sums = new TextDecoder().decode(files['SHA256SUMS']).trim().split('\n');
  expect(sums.length).toBeGreaterThanOrEqual(FEWEST_FILES);
  for (const line of sums) {
    const [hash = '', path = ''] = line.split('  ');
    expect(sha256(files[path]), path).toBe(hash);
  }
  // Whatever is in the archive is in the manifest.
  expect(Object.keys(files).filter((path) => !path.endsWith('/')).length).toBe(sums.length + 1);
}

const sha256 = (content: Uint8Array | undefined): string =>
  createHash('sha256')
    .update(content ?? '')
    .digest('hex');
