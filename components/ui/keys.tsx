'use client';

import { useEffect, useState } from 'react';
import { KeyBuffer } from './key-buffer';
import { KeyHelp, type KeyLine } from './key-help';

/** Sent with what a scanner typed into the open page. */
export const SCAN_EVENT = 'lotwright:scan';

/** Sent when the person switches single keys on or off: it must hold before the page has come again. */
export const SINGLE_KEYS_EVENT = 'lotwright:single-keys';

const SEQUENCE_MS = 1200;

/**
 * Keys of every page, mounted once by the shell. A key presses whatever carries `data-key` with its name, so a page
 * says what its keys do simply by showing the buttons.
 */
export function Keys({ singleKeys: given = true }: { singleKeys?: boolean }) {
  const singleKeys = useSwitchedHere() ?? given;
  const [help, setHelp] = useState<readonly KeyLine[] | null>(null);

  useEffect(() => {
    const sequence = startSequence();
    const onKey = (key: string) => {
      if (!singleKeys) return;
      if (key === '?') setHelp(visibleKeys());
      else sequence(key.toLowerCase());
    };
    const onScan = (text: string) => window.dispatchEvent(new CustomEvent(SCAN_EVENT, { detail: text }));
    const buffer = new KeyBuffer({ onKey, onScan });

    const listen = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.isComposing) return;
      if ((event.ctrlKey || event.metaKey) && event.key.toLowerCase() === 'k')
        return void focusNumberField(event);
      if (event.ctrlKey || event.metaKey || event.altKey || isTaken(event.target)) return;
      if (event.key === 'Enter' && buffer.end()) return event.preventDefault();
      if (event.key === 'Escape') return void press('escape');
      if (event.key === '/' && singleKeys) return void focusNumberField(event);
      if (event.key.length === 1 && event.key !== ' ') buffer.push(event.key);
    };
    document.addEventListener('keydown', listen);
    return () => {
      document.removeEventListener('keydown', listen);
      buffer.stop();
    };
  }, [singleKeys]);

  return <KeyHelp keys={help} onClose={() => setHelp(null)} />;
}

function useSwitchedHere(): boolean | null {
  const [switched, setSwitched] = useState<boolean | null>(null);
  useEffect(() => {
    const take = (event: Event) => event instanceof CustomEvent && setSwitched(event.detail === true);
    window.addEventListener(SINGLE_KEYS_EVENT, take);
    return () => window.removeEventListener(SINGLE_KEYS_EVENT, take);
  }, []);
  return switched;
}

/** Typing belongs to fields, and to a dialog that asks something. */
function isTaken(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (document.querySelector('dialog[open]')) return true;
  return (
    target.isContentEditable || target.matches('input:not([type=checkbox], [type=radio]), textarea, select')
  );
}

function startSequence() {
  let goes: ReturnType<typeof setTimeout> | undefined;
  return (key: string) => {
    if (goes) {
      clearTimeout(goes);
      goes = undefined;
      press(`g ${key}`);
    } else if (key === 'g') {
      goes = setTimeout(() => (goes = undefined), SEQUENCE_MS);
    } else if (key === 'j' || key === 'k') {
      moveRow(key === 'j' ? 1 : -1);
    } else {
      press(key);
    }
  };
}

function press(key: string): boolean {
  const target = [...document.querySelectorAll<HTMLElement>(`[data-key="${CSS.escape(key)}"]`)].find(
    canBeSeen,
  );
  if (!target) return false;
  if (target.matches('input, textarea, select')) target.focus();
  else target.click();
  return true;
}

/** Rows are walked by what they open, so Enter needs no rule of its own. */
function moveRow(by: 1 | -1) {
  const rows = [...document.querySelectorAll<HTMLElement>('[data-row]')].filter(
    (row) => canBeSeen(row) && row.querySelector(OPENS) !== null,
  );
  const here = rows.findIndex((row) => row.contains(document.activeElement));
  const start = by === 1 ? 0 : rows.length - 1;
  const row = rows[here === -1 ? start : here + by];
  const target = row?.querySelector<HTMLElement>(OPENS);
  // A script's focus shows no ring unless it is told that a key caused it.
  target?.focus({ focusVisible: true } as FocusOptions);
  row?.scrollIntoView({ block: 'nearest' });
}

const OPENS = 'a[href], button:not(:disabled)';

function focusNumberField(event: KeyboardEvent) {
  const field = [...document.querySelectorAll<HTMLInputElement>('[data-number-field]')].find(canBeSeen);
  if (!field) return;
  event.preventDefault();
  field.focus();
  field.select();
}

/** What lies in a closed `<details>` has a size and still cannot take the focus. */
function canBeSeen(element: HTMLElement): boolean {
  return element.checkVisibility();
}

function visibleKeys(): KeyLine[] {
  const found = [...document.querySelectorAll<HTMLElement>('[data-key]')].filter(canBeSeen);
  const lines = found.map((element) => ({ keys: element.dataset['key'] ?? '', says: nameOf(element) }));
  return lines.filter((line, index) => lines.findIndex((other) => other.keys === line.keys) === index);
}

function nameOf(element: HTMLElement): string {
  const named = element.dataset['keySays'] ?? element.getAttribute('aria-label');
  if (named) return named;
  const copy = element.cloneNode(true) as HTMLElement;
  for (const cap of copy.querySelectorAll('kbd, [aria-hidden=true]')) cap.remove();
  return copy.textContent.trim();
}
