/** A person cannot type four keys this close together; a scanner cannot help it. */
const PAUSE_MS = 45;
const SHORTEST_SCAN = 4;

interface KeyBufferEvents {
  onKey: (key: string) => void;
  onScan: (text: string) => void;
}

/** Tells a scanner that types into the open page from a person who presses single keys. */
export class KeyBuffer {
  #typed = '';
  #timer: ReturnType<typeof setTimeout> | undefined;
  readonly #events: KeyBufferEvents;

  constructor(events: KeyBufferEvents) {
    this.#events = events;
  }

  push(key: string): void {
    this.#typed += key;
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => this.#flush(), PAUSE_MS);
  }

  /** Enter ends a scan; true when it was one, and belongs to nobody else. */
  end(): boolean {
    const wasScan = this.#typed.length >= SHORTEST_SCAN;
    this.#flush();
    return wasScan;
  }

  stop(): void {
    clearTimeout(this.#timer);
    this.#typed = '';
  }

  #flush(): void {
    const typed = this.#typed;
    this.stop();
    if (typed.length >= SHORTEST_SCAN) this.#events.onScan(typed);
    else for (const key of typed) this.#events.onKey(key);
  }
}
