'use client';

import { useRouter } from 'next/navigation';
import { type KeyboardEvent, useCallback, useEffect, useId, useRef, useState } from 'react';
import { SCAN_EVENT } from '@/components/ui/keys';

export interface NumberHit {
  /** Batch, Part, Lot, Order, Certificate, Invoice. */
  kind: string;
  number: string;
  /** What it is, after its number: "Ostrow Heat Treating, at processor". */
  says: string;
  href: string;
}

interface NumberFieldProps {
  /** Answers with what has this number, or a number like it. */
  search: (text: string) => Promise<readonly NumberHit[]>;
  /** A scanner that types into the page is answered by one field only. */
  takesScans?: boolean;
  autoFocus?: boolean;
  /** After something was opened: a sheet closes itself. */
  onOpened?: () => void;
  className?: string;
}

interface Found {
  text: string;
  hits: readonly NumberHit[];
  failed?: boolean;
}

const WAIT_MS = 140;

/** One field for any number. A scanner ends with Enter: what it names opens without a list in between. */
export function NumberField({
  search,
  takesScans = true,
  autoFocus = false,
  onOpened,
  className = '',
}: NumberFieldProps) {
  const router = useRouter();
  const id = useId();
  const [text, setText] = useState('');
  const [found, setFound] = useState<Found | null>(null);
  const [active, setActive] = useState(-1);
  const [open, setOpen] = useState(false);
  const field = useRef<HTMLInputElement>(null);
  const asked = useRef('');
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);

  const go = useCallback(
    (hit: NumberHit) => {
      setText('');
      setFound(null);
      setOpen(false);
      field.current?.blur();
      router.push(hit.href);
      onOpened?.();
    },
    [router, onOpened],
  );

  const ask = useCallback(
    async (wanted: string): Promise<Found> => {
      asked.current = wanted;
      const answer = await search(wanted).then(
        (hits): Found => ({
          text: wanted,
          hits: byKind(hits).flatMap((kind) => kind.members.map(({ hit }) => hit)),
        }),
        (): Found => ({ text: wanted, hits: [], failed: true }),
      );
      // A slow answer to an older question must not cover a newer one.
      if (asked.current === wanted) {
        setFound(answer);
        setActive(-1);
        setOpen(true);
      }
      return answer;
    },
    [search],
  );

  const openOrList = useCallback(
    async (wanted: string) => {
      clearTimeout(timer.current);
      const { hits } = await ask(wanted);
      const only =
        hits.length === 1 ? hits[0] : hits.find((hit) => hit.number.toLowerCase() === wanted.toLowerCase());
      if (only) go(only);
    },
    [ask, go],
  );

  useEffect(() => {
    if (!takesScans) return;
    const take = (event: Event) => {
      if (!(event instanceof CustomEvent) || typeof event.detail !== 'string') return;
      const scanned = event.detail.replace(/^\//, '').trim();
      setText(scanned);
      field.current?.focus();
      void openOrList(scanned);
    };
    window.addEventListener(SCAN_EVENT, take);
    return () => window.removeEventListener(SCAN_EVENT, take);
  }, [takesScans, openOrList]);

  useEffect(() => {
    if (autoFocus) field.current?.focus();
    return () => clearTimeout(timer.current);
  }, [autoFocus]);

  const type = (typed: string) => {
    setText(typed);
    clearTimeout(timer.current);
    const wanted = typed.trim();
    if (wanted === '') {
      asked.current = '';
      setFound(null);
      setOpen(false);
    } else {
      timer.current = setTimeout(() => void ask(wanted), WAIT_MS);
    }
  };

  const hits = found?.hits ?? [];
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      const by = event.key === 'ArrowDown' ? 1 : -1;
      if (hits.length > 0)
        setActive((active + by + (active < 0 && by < 0 ? 1 : 0) + hits.length) % hits.length);
      setOpen(found !== null);
    } else if (event.key === 'Enter') {
      event.preventDefault();
      const chosen = open ? hits[active] : undefined;
      if (chosen) go(chosen);
      else if (text.trim() !== '') void openOrList(text.trim());
    } else if (event.key === 'Escape') {
      if (open) setOpen(false);
      else field.current?.blur();
    }
  };

  return (
    <div
      role="search"
      className={`relative ${className}`}
      onBlur={(event) => leaves(event) && setOpen(false)}
    >
      <input
        ref={field}
        data-number-field=""
        type="text"
        role="combobox"
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        aria-label="Scan or type a number"
        aria-expanded={open}
        aria-controls={`${id}-list`}
        aria-activedescendant={open && active >= 0 ? `${id}-${active}` : undefined}
        aria-autocomplete="list"
        placeholder="Scan or type a number"
        value={text}
        onChange={(event) => type(event.currentTarget.value)}
        onKeyDown={onKeyDown}
        onFocus={() => setOpen(found !== null)}
        className="h-8 w-full border border-line bg-field pr-9 pl-2 font-sans text-string placeholder:text-faint touch:h-11"
      />
      <kbd aria-hidden="true" className="absolute top-1/2 right-2 -translate-y-1/2 touch:hidden">
        /
      </kbd>
      <HitList id={id} found={open ? found : null} active={active} go={go} />
    </div>
  );
}

function leaves(event: { currentTarget: Element; relatedTarget: EventTarget | null }) {
  return !(event.relatedTarget instanceof Node && event.currentTarget.contains(event.relatedTarget));
}

interface HitListProps {
  id: string;
  found: Found | null;
  active: number;
  go: (hit: NumberHit) => void;
}

function HitList({ id, found, active, go }: HitListProps) {
  const hits = found?.hits ?? [];
  return (
    <>
      <div
        id={`${id}-list`}
        role="listbox"
        aria-label="What has this number"
        hidden={hits.length === 0}
        className="absolute top-full right-0 z-40 mt-1 max-h-[60dvh] w-[min(30rem,calc(100vw-2rem))] overflow-y-auto border-heavy border-ink bg-paper"
      >
        {byKind(hits).map(({ kind, members }) => (
          <div key={kind} role="group" aria-labelledby={`${id}-${kind}`}>
            <div
              id={`${id}-${kind}`}
              role="presentation"
              className="px-3 pt-2 pb-0.5 font-cond text-caption text-faint"
            >
              {kind}
            </div>
            {members.map(({ hit, index }) => (
              <div
                key={hit.href}
                id={`${id}-${index}`}
                role="option"
                aria-selected={index === active}
                // The field keeps the focus: losing it would close the list before the press is done.
                onPointerDown={(event) => event.preventDefault()}
                onClick={() => go(hit)}
                className={`flex min-h-[31px] cursor-pointer items-center gap-3 border-b border-rule px-3 py-1 text-row hover:bg-bench touch:min-h-12 ${
                  index === active ? 'bg-bench shadow-none outline-1 -outline-offset-1 outline-ink' : ''
                }`}
              >
                <span className="num flex-none font-semibold">{hit.number}</span>
                <span className="truncate text-quiet">{hit.says}</span>
              </div>
            ))}
          </div>
        ))}
      </div>
      <div
        role="status"
        className={
          found && hits.length === 0
            ? 'absolute top-full right-0 z-40 mt-1 w-full min-w-60 border-heavy border-ink bg-paper px-3 py-2 text-second'
            : 'sr-only'
        }
      >
        {found && sentenceOf(found)}
      </div>
    </>
  );
}

function sentenceOf({ text, hits, failed }: Found): string {
  if (failed) return 'The search did not answer. Try again.';
  if (hits.length === 0) return `Nothing has the number ${text}.`;
  return `${hits.length} ${hits.length === 1 ? 'has' : 'have'} this number.`;
}

function byKind(hits: readonly NumberHit[]) {
  const kinds = new Map<string, { hit: NumberHit; index: number }[]>();
  hits.forEach((hit, index) => kinds.set(hit.kind, [...(kinds.get(hit.kind) ?? []), { hit, index }]));
  return [...kinds].map(([kind, members]) => ({ kind, members }));
}
