'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';

export interface Message {
  /** The thing first: "L-0242 added to load 1." */
  says: string;
  /** `Undo`, `See the mail`, `Show both`. */
  action?: { says: string; run: () => void | Promise<unknown> } | { says: string; href: string };
  /** Did not happen: stays until it is dismissed. */
  failed?: boolean;
}

type Shown = Message & { id: number };

const SECONDS_SHOWN = 6;
const MOST_AT_ONCE = 4;
const NONE: readonly Shown[] = [];

let shown = NONE;
let lastId = 0;
const listeners = new Set<() => void>();

function replace(next: readonly Shown[]) {
  shown = next;
  for (const listener of listeners) listener();
}

/** Bottom left, over whatever screen is open. */
export function showMessage(message: Message): void {
  lastId += 1;
  replace([...shown.slice(1 - MOST_AT_ONCE), { ...message, id: lastId }]);
}

function dismiss(id: number) {
  replace(shown.filter((message) => message.id !== id));
}

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Stands once in the layout. */
export function Messages() {
  const messages = useSyncExternalStore(
    subscribe,
    () => shown,
    () => NONE,
  );
  return (
    <div className="lw-messages pointer-events-none fixed bottom-4 left-4 z-50 flex w-[min(32.5rem,calc(100vw-2rem))] flex-col gap-2.5 max-md:bottom-20">
      <div role="status" className="flex flex-col gap-2.5">
        {messages.filter((message) => !message.failed).map(asLine)}
      </div>
      <div role="alert" className="flex flex-col gap-2.5">
        {messages.filter((message) => message.failed).map(asLine)}
      </div>
    </div>
  );
}

const asLine = (message: Shown) => <MessageLine key={message.id} message={message} />;

function MessageLine({ message }: { message: Shown }) {
  const { id, says, action, failed = false } = message;
  const [stays, setStays] = useState(false);
  const close = () => dismiss(id);

  useEffect(() => {
    if (failed || stays) return;
    const timer = setTimeout(() => dismiss(id), SECONDS_SHOWN * 1000);
    return () => clearTimeout(timer);
  }, [id, failed, stays]);

  return (
    <div
      className={`lw-message pointer-events-auto flex items-baseline gap-4 px-4 py-2.5 text-row text-paper ${failed ? 'bg-held-ink' : 'bg-ink'}`}
      onPointerEnter={() => setStays(true)}
      onPointerLeave={() => setStays(false)}
      onFocus={() => setStays(true)}
      onBlur={() => setStays(false)}
    >
      <span>{says}</span>
      <span className="ml-auto flex gap-4 whitespace-nowrap">
        {action && <MessageAction action={action} close={close} />}
        {failed && (
          <button type="button" className="lw-word-button" onClick={close}>
            Dismiss
          </button>
        )}
      </span>
    </div>
  );
}

function MessageAction({ action, close }: { action: NonNullable<Message['action']>; close: () => void }) {
  if ('href' in action) {
    return (
      <a className="lw-word-button decoration-current" href={action.href}>
        {action.says}
      </a>
    );
  }
  const press = () => {
    close();
    void action.run();
  };
  return (
    <button type="button" className="lw-word-button" onClick={press}>
      {action.says}
    </button>
  );
}
