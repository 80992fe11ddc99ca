import { randomBytes } from 'node:crypto';
import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { readMessage } from './message';
import type { Envelope, StoredMessage } from './message';

/** The kept mail: one file with the bytes as received and one with what they say, so that it survives a restart. */
export class MailStore {
  private readonly messages = new Map<string, StoredMessage>();

  private constructor(private readonly dir: string) {}

  static async open(dir: string): Promise<MailStore> {
    await mkdir(dir, { recursive: true });
    const store = new MailStore(dir);
    const names = (await readdir(dir)).filter((name) => name.endsWith('.json')).sort();
    for (const name of names) {
      const message = JSON.parse(await readFile(path.join(dir, name), 'utf8')) as StoredMessage;
      store.messages.set(message.id, message);
    }
    return store;
  }

  /** Returns only when both files are on disk: the SMTP answer that follows is a promise to keep the message. */
  async add(raw: Buffer, envelope: Envelope, receivedAt: Date): Promise<StoredMessage> {
    const id = `${receivedAt.toISOString().replace(/\D/g, '')}-${randomBytes(4).toString('hex')}`;
    const message = await readMessage(id, raw, envelope, receivedAt);
    await this.write(`${id}.eml`, raw);
    await this.write(`${id}.json`, JSON.stringify(message, null, 2));
    this.messages.set(id, message);
    return message;
  }

  /** Newest first. `to` is matched against the envelope, so copies in secret are found too. */
  list({ to, limit = 500 }: { to?: string | undefined; limit?: number } = {}): StoredMessage[] {
    const wanted = to?.trim().toLowerCase();
    return [...this.messages.values()]
      .filter(({ recipients }) => !wanted || recipients.includes(wanted))
      .reverse()
      .slice(0, limit);
  }

  find(id: string): StoredMessage | null {
    return this.messages.get(id) ?? null;
  }

  /** Only for an id that `find` knows: it becomes part of a file name. */
  raw(message: StoredMessage): Promise<Buffer> {
    return readFile(path.join(this.dir, `${message.id}.eml`));
  }

  async remove(messages: readonly StoredMessage[]): Promise<void> {
    for (const { id } of messages) {
      this.messages.delete(id);
      await rm(path.join(this.dir, `${id}.json`), { force: true });
      await rm(path.join(this.dir, `${id}.eml`), { force: true });
    }
  }

  private async write(name: string, content: Buffer | string): Promise<void> {
    const target = path.join(this.dir, name);
    await writeFile(`${target}.partial`, content);
    await rename(`${target}.partial`, target);
  }
}
