import pg from 'pg';

import { env } from '@/lib/env';

import { BROKEN_WORDS, verifyChains } from './verify-chain';

/** `npm run audit:verify`: exit 0 when every chain holds, 1 when a link is broken, 2 when it could not be looked at. */
async function main(): Promise<number> {
  const client = new pg.Client({ connectionString: env.DATABASE_OWNER_URL });
  await client.connect();
  let exit = 0;
  try {
    for await (const { shop, shopId, entries, broken } of verifyChains(client)) {
      if (broken === null) console.log(`${shop}: ${entries} entries, the chain holds.`);
      else {
        console.error(
          `${shop}: BROKEN at entry ${broken.seq}, which ${BROKEN_WORDS[broken.what]}. ${entries} entries before it hold. (shop ${shopId})`,
        );
        exit = 1;
      }
    }
  } finally {
    await client.end();
  }
  return exit;
}

process.exitCode = await main().catch((error: unknown) => {
  console.error(`The trail could not be read: ${error instanceof Error ? error.message : String(error)}`);
  return 2;
});
