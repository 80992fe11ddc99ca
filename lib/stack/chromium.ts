import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];

/** The browser of this machine; its usual place when there is none yet, so that the message names it. */
export function chromiumPath(): string {
  return process.env['CHROMIUM_PATH'] ?? findChromium() ?? '/usr/bin/chromium';
}

export function findChromium(): string | undefined {
  const folders = (process.env['PATH'] ?? '').split(delimiter).concat('/usr/bin');
  return NAMES.flatMap((name) => folders.map((folder) => join(folder, name))).find((file) =>
    existsSync(file),
  );
}
