import { test as base, expect, type Locator, type Page } from '@playwright/test';

import { DEMO_PASSWORD } from '@/db/seed/sign-ins';

import { looksRight } from './look';

/** What a way through the product cost the person: printed at its end, because fewer is better than prettier. */
export interface Cost {
  clicks: number;
  keys: number;
  pages: number;
  waitedS: number;
}

const NOTHING_SPENT: Cost = { clicks: 0, keys: 0, pages: 0, waitedS: 0 };

/** A person at a browser. Counts presses, typed keys, pages and the seconds of waiting for what was asked. */
export class Person {
  private cost = NOTHING_SPENT;

  constructor(
    readonly name: string,
    readonly page: Page,
    readonly width: number,
  ) {
    page.on('framenavigated', (frame) => {
      if (frame === page.mainFrame()) this.spends({ pages: 1 });
    });
  }

  async goTo(path: string): Promise<void> {
    await this.waiting(() => this.page.goto(path));
  }

  async press(target: Locator): Promise<void> {
    this.spends({ clicks: 1 });
    await this.waiting(() => target.click());
  }

  /** Types into a field, replacing what is there. */
  async type(target: Locator, text: string): Promise<void> {
    this.spends({ clicks: 1, keys: text.length });
    await this.waiting(() => target.fill(text));
  }

  /** Opens a list and takes one of its choices. */
  async choose(target: Locator, choice: string | { index: number }): Promise<void> {
    this.spends({ clicks: 2 });
    await this.waiting(() => target.selectOption(choice));
  }

  /** Gives a file: the button and the file in the system's own window. */
  async gives(target: Locator, name: string, content: Buffer): Promise<void> {
    this.spends({ clicks: 2 });
    const mimeType = name.endsWith('.csv') ? 'text/csv' : 'application/pdf';
    await this.waiting(() => target.setInputFiles({ name, mimeType, buffer: content }));
  }

  async key(key: string): Promise<void> {
    this.spends({ keys: 1 });
    await this.waiting(() => this.page.keyboard.press(key));
  }

  /** Waits until something is to be seen; the time counts as the person's. */
  async sees(target: Locator): Promise<void> {
    await this.waiting(() => expect(target).toBeVisible({ timeout: 30_000 }));
  }

  async signIn(email: string): Promise<void> {
    await this.goTo('/sign-in');
    await this.type(this.page.getByLabel('E-mail'), email);
    await this.type(this.page.getByLabel('Password'), DEMO_PASSWORD);
    await this.press(this.page.getByRole('button', { name: 'Sign in', exact: true }));
    await this.waiting(() =>
      this.page.waitForURL((url) => !url.pathname.startsWith('/sign-in'), { timeout: 60_000 }),
    );
  }

  /** Keeps a picture of the page and has it looked over; no time of the person's. */
  looks(name: string): Promise<void> {
    return looksRight(this.page, `${name}-${this.width}`);
  }

  /** One line for the log: what the way cost since the last one. */
  report(way: string): void {
    const { clicks, keys, pages, waitedS } = this.cost;
    console.log(
      `${this.name} at ${this.width} px, ${way}: ${clicks} clicks, ${keys} keys, ${pages} pages, ${waitedS.toFixed(1)} s of waiting`,
    );
    this.cost = NOTHING_SPENT;
  }

  private spends(more: Partial<Cost>): void {
    const { clicks = 0, keys = 0, pages = 0, waitedS = 0 } = more;
    const was = this.cost;
    this.cost = {
      clicks: was.clicks + clicks,
      keys: was.keys + keys,
      pages: was.pages + pages,
      waitedS: was.waitedS + waitedS,
    };
  }

  private async waiting<T>(work: () => Promise<T>): Promise<T> {
    const began = performance.now();
    try {
      return await work();
    } finally {
      this.spends({ waitedS: (performance.now() - began) / 1000 });
    }
  }
}

interface People {
  /** A person with a browser of their own: no cookie is shared. */
  person(name: string, width?: number): Promise<Person>;
}

export const test = base.extend<People>({
  person: async ({ browser, baseURL }, give) => {
    const contexts: Awaited<ReturnType<typeof browser.newContext>>[] = [];
    await give(async (name, width = 1440) => {
      const context = await browser.newContext({
        ...(baseURL === undefined ? {} : { baseURL }),
        viewport: { width, height: width < 500 ? 844 : 900 },
        hasTouch: width < 900,
      });
      contexts.push(context);
      return new Person(name, await context.newPage(), width);
    });
    for (const context of contexts) await context.close();
  },
});

/** The id at the end of a page's address. */
export const idIn = (url: string): string => new URL(url).pathname.split('/').at(-1) ?? '';

export { expect };
