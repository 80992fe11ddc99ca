import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import type { FileView, SignedUpload } from '@/lib/files/contract';
import { readObject } from '@/lib/storage/object-store';

import { somePdf } from '../factories/uploads';
import { andAgain, untilAnswered } from './browser';
import { inRounds, ROUNDS } from './rounds';
import { aWorld, count, openSetting } from './setting';

const setting = openSetting();

test(`upload, the door killed in ${ROUNDS} rounds: the file counts once and is what was sent`, async () => {
  const { cookie } = await aWorld(setting);
  await inRounds(setting.door, 2, async (disturb, number) => {
    const content = somePdf(`round ${number}`);
    const sha256 = createHash('sha256').update(content).digest('hex');
    const announcing = {
      path: '/files',
      cookie,
      key: `announce ${number}`,
      body: {
        purpose: 'mill_certificate',
        name: `mill ${number}.pdf`,
        size: content.length,
        mediaType: 'application/pdf',
        sha256,
      },
    };
    const completing = (fileId: string) => ({
      path: `/files/${fileId}/complete`,
      cookie,
      key: `complete ${number}`,
      body: {},
    });

    const [announced, answer] = await disturb(async () => {
      const first = await untilAnswered(announcing);
      const { file, upload } = first.body as { file: FileView; upload: SignedUpload };
      const { status } = await fetch(upload.url, {
        method: upload.method,
        headers: upload.headers,
        body: new Uint8Array(content),
      });
      expect(status).toBe(200);
      return [first, await untilAnswered(completing(file.id))] as const;
    });
    expect(answer).toMatchObject({ status: 200, body: { state: 'verified', sha256 } });
    const { id } = answer.body as FileView;
    await andAgain(announcing, announced);
    await andAgain(completing(id), answer);

    const { rows } = await setting.owner.execute<{ id: string; state: string; key: string }>(
      sql`select id, state, storage_key as key from files where sha256 = ${sha256}`,
    );
    expect(rows).toEqual([{ id, state: 'verified', key: expect.any(String) as string }]);
    expect(await readObject(rows[0]?.key ?? '')).toEqual(content);
    expect(
      await count(
        setting,
        sql`select from audit_entries where action in ('file.announce', 'file.receive') and entity_id = ${id}`,
      ),
    ).toBe(2);
  });
});
