import { connect, withTenant, type Db, type Tenant } from '@/db/client';
import type { Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';

import type { DemoOrganisations, DemoPerson, DemoProcessor } from './organisations';

/** The people and days of the story: runs each scene through the same verbs that the screens call, at the scene's own time. */
export class StagePlay {
  constructor(
    readonly db: Db,
    readonly cast: DemoOrganisations,
    readonly today: Date,
  ) {}

  /** A scene in the yard. */
  asPerson<T>(
    person: DemoPerson,
    at: Date,
    work: (ctx: Ctx) => Promise<T>,
    shopId = this.cast.shopId,
  ): Promise<T> {
    return this.within(
      { kind: 'shop', shopId, personId: person.id },
      { kind: 'person', userId: person.id, name: person.name, roles: person.roles },
      at,
      work,
    );
  }

  /** A scene at the processor, as its person at the desk. */
  asProcessor<T>(processor: DemoProcessor, at: Date, work: (ctx: Ctx) => Promise<T>): Promise<T> {
    return this.within(
      { kind: 'processor', processorId: processor.id, batchId: null, personId: processor.personId },
      {
        kind: 'person',
        userId: processor.personId,
        name: `${processor.contact}, ${processor.name}`,
        roles: ['processor'],
      },
      at,
      work,
    );
  }

  private within<T>(
    tenant: Tenant,
    actor: Ctx['actor'],
    now: Date,
    work: (ctx: Ctx) => Promise<T>,
  ): Promise<T> {
    return withTenant(this.db, tenant, (tx) =>
      work({ tenant, actor, tx, now, requestId: newId(), address: null }),
    );
  }
}

/** A part of the story: yields the moment of its next scene, and plays that scene when it is called again. */
export type Thread = AsyncGenerator<Date, void, void>;

/** Plays all threads in the order of their scenes, so that numbers and the audit trail run as they would have. Scenes after the end are not played. */
export async function playAll(threads: readonly Thread[], end: Date): Promise<void> {
  const waiting: { thread: Thread; at: Date }[] = [];
  const advance = async (thread: Thread) => {
    const { value, done } = await thread.next();
    if (!done && value <= end) waiting.push({ thread, at: value });
  };
  for (const thread of threads) await advance(thread);
  while (waiting.length > 0) {
    waiting.sort((a, b) => b.at.getTime() - a.at.getTime());
    const next = waiting.pop();
    if (next) await advance(next.thread);
  }
}

export const openStage = (url: string) => connect(url, 4);
