'use client';

import { Button } from './button';
import { Dialog } from './dialog';

export interface KeyLine {
  /** As it is written in `data-key`: "a", "g t". */
  keys: string;
  says: string;
}

const EVERYWHERE: readonly KeyLine[] = [
  { keys: '/', says: 'scan or type any number; Ctrl K too' },
  { keys: 'j k', says: 'next and last row' },
  { keys: 'enter', says: 'open' },
  { keys: '?', says: 'all keys of this page' },
];

/** All keys of the page that is open. */
export function KeyHelp({ keys, onClose }: { keys: readonly KeyLine[] | null; onClose: () => void }) {
  return (
    <Dialog
      open={keys !== null}
      onClose={onClose}
      title="Keys of this page"
      actions={<Button onClick={onClose}>Close</Button>}
    >
      <dl className="grid grid-cols-[auto_1fr] items-baseline gap-x-5 gap-y-1.5">
        {[...EVERYWHERE, ...(keys ?? [])].map((line) => (
          <KeyRow key={line.keys} line={line} />
        ))}
      </dl>
      <p className="pt-3 text-second text-quiet">
        No key signs, pays or dispatches. Single keys are switched off at your name.
      </p>
    </Dialog>
  );
}

function KeyRow({ line: { keys, says } }: { line: KeyLine }) {
  return (
    <>
      <dt className="flex gap-1">
        {keys.split(' ').map((key) => (
          <kbd key={key}>{key.length === 1 ? key.toUpperCase() : capital(key)}</kbd>
        ))}
      </dt>
      <dd>{says}</dd>
    </>
  );
}

const capital = (word: string) => (word === 'escape' ? 'Esc' : word.charAt(0).toUpperCase() + word.slice(1));
