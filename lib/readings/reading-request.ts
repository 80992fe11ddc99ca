import type { ChartAsk } from './read-document-queue';
import type { ReadingKind } from './reading-state';

/** What the reading process is asked, and what it answers. */
export interface ReadingRequest {
  id: number;
  /** To be read as that; of a chart that was judged, its picture may be asked for as well. */
  kind: ReadingKind | 'chart_picture';
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
