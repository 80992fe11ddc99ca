import type { ChartAsk } from './read-document-queue';
import type { ReadingKind } from './reading-state';

/** What the reading process is asked, and what it answers. */
export interface ReadingRequest {
  id: number;
  kind: ReadingKind;
  name: string;
  bytes: Uint8Array;
  /** What a chart is held against. */
  ask?: ChartAsk;
}

export type ReadingAnswer = { id: number } & (
  | { content: unknown; pages: unknown }
  /** Why it cannot be read: a code for programs, a sentence for people. */
  | { fault: { code: string; message: string } }
  /** Something of ours went wrong; it may be tried again. */
  | { error: string }
);
