import { createHash } from 'node:crypto';
import type { Client } from 'pg';

export interface BrokenLink {
  shopId: string;
  seq: number;
  what: 'altered' | 'unlinked' | 'missing';
}

export interface ChainReport {
  shopId: string;
  shop: string;
  entries: number;
  broken: BrokenLink | null;
}

const AT_ONCE = 2000;

interface Link {
  seq: string;
  previous_hash: string;
  hash: string;
  text: string;
}

/**
 * Walks every shop's chain from its first entry and computes each hash anew here, not in the database that made it.
 * Ends a chain at its first broken link: what follows rests on it. Needs a connection that sees all shops.
 *
 * That entries were cut off at the end cannot be seen from the chain itself; keep the number and hash of the last
 * entry somewhere else to be able to tell.
 */
export async function* verifyChains(client: Pick<Client, 'query'>): AsyncGenerator<ChainReport> {
  const { rows: shops } = await client.query<{ id: string; name: string }>(
    'select id, name from shops order by id',
  );
  for (const shop of shops)
    yield { shopId: shop.id, shop: shop.name, ...(await verifyChain(client, shop.id)) };
}

async function verifyChain(
  client: Pick<Client, 'query'>,
  shopId: string,
): Promise<{ entries: number; broken: BrokenLink | null }> {
  let [entries, hash] = [0, ''];
  for (;;) {
    const { rows } = await client.query<Link>(
      'select e.seq, e.previous_hash, e.hash, audit_text(e) as text from audit_entries e where shop_id = $1 and seq > $2 order by seq limit $3',
      [shopId, entries, AT_ONCE],
    );
    for (const link of rows) {
      const what = faultOf(link, entries + 1, hash);
      if (what !== null)
        return {
          entries,
          broken: { shopId, seq: what === 'missing' ? entries + 1 : Number(link.seq), what },
        };
      entries += 1;
      hash = link.hash;
    }
    if (rows.length < AT_ONCE) return { entries, broken: null };
  }
}

function faultOf(link: Link, seq: number, previousHash: string): BrokenLink['what'] | null {
  if (Number(link.seq) !== seq) return 'missing';
  if (link.previous_hash !== previousHash) return 'unlinked';
  const computed = createHash('sha256')
    .update(link.previous_hash + link.text, 'utf8')
    .digest('hex');
  return computed === link.hash ? null : 'altered';
}

export const BROKEN_WORDS: Record<BrokenLink['what'], string> = {
  altered: 'was changed after it was written',
  unlinked: 'does not follow from the entry before it',
  missing: 'is not there',
};
