'use client';

import Link from 'next/link';
import { type ComponentProps, type MouseEvent, type ReactNode, useId, useRef, useState } from 'react';

export type ButtonLook = 'primary' | 'outlined' | 'stop' | 'word';

interface Look {
  look?: ButtonLook;
  size?: 'normal' | 'small' | 'big';
  /** The single key that presses it, shown inside. Never for what signs, pays or dispatches. */
  shortcut?: string;
  className?: string;
}

interface ButtonProps extends Look, Omit<ComponentProps<'button'>, 'className' | 'onClick' | 'disabled'> {
  onClick?: (event: MouseEvent<HTMLButtonElement>) => void | Promise<unknown>;
  busy?: boolean;
  /** What is being done: "Sending, 2 of 3". */
  busyLabel?: string;
  /** Why it cannot be pressed now. The button stays readable and says so beside it. */
  notNow?: string | false | undefined;
  /** Where the reason stands; `elsewhere` when the screen already says it (give `aria-describedby`). */
  reasonAt?: 'beside' | 'below' | 'elsewhere';
}

export function Button(props: ButtonProps) {
  const {
    look,
    size,
    shortcut,
    className,
    onClick,
    busy = false,
    busyLabel,
    notNow,
    reasonAt = 'beside',
    ...rest
  } = props;
  const { children, type = 'button', ...attributes } = rest;
  const reasonId = useId();
  const held = useHeldUntilDone();
  const working = busy || held.working;

  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (working || notNow) {
      event.preventDefault();
      event.stopPropagation();
      return;
    }
    held.run(() => onClick?.(event));
  };

  const button = (
    <button
      {...attributes}
      {...shortcutAttributes(shortcut)}
      type={type}
      className={buttonClass({ look, size, className })}
      aria-busy={working || undefined}
      aria-disabled={notNow ? true : undefined}
      aria-describedby={notNow && reasonAt !== 'elsewhere' ? reasonId : attributes['aria-describedby']}
      onClick={press}
    >
      {working && busyLabel ? busyLabel : children}
      {shortcut && look !== 'word' && <Shortcut shortcut={shortcut} />}
    </button>
  );

  if (!notNow || reasonAt === 'elsewhere') return withShortcut(button, look, shortcut);
  return (
    <span
      className={`inline-flex gap-3 ${reasonAt === 'below' ? 'flex-col items-stretch gap-1.5' : 'items-center'}`}
    >
      {button}
      <span id={reasonId} className="text-second text-quiet">
        {notNow}
      </span>
    </span>
  );
}

interface ButtonLinkProps extends Look, Omit<ComponentProps<typeof Link>, 'className'> {}

/** Looks like a button, goes to a page. */
export function ButtonLink({ look, size, shortcut, className, children, ...link }: ButtonLinkProps) {
  const anchor = (
    <Link {...link} {...shortcutAttributes(shortcut)} className={buttonClass({ look, size, className })}>
      {children}
      {shortcut && look !== 'word' && <Shortcut shortcut={shortcut} />}
    </Link>
  );
  return withShortcut(anchor, look, shortcut);
}

function withShortcut(pressed: ReactNode, look: ButtonLook | undefined, shortcut: string | undefined) {
  if (look !== 'word' || !shortcut) return pressed;
  return (
    <span className="inline-flex items-center gap-2 whitespace-nowrap">
      {pressed}
      <Shortcut shortcut={shortcut} />
    </span>
  );
}

function Shortcut({ shortcut }: { shortcut: string }) {
  return (
    <kbd aria-hidden="true" className="touch:hidden">
      {shortcut}
    </kbd>
  );
}

/** The router of keys finds what to press by this attribute. */
function shortcutAttributes(shortcut: string | undefined) {
  return shortcut ? { 'data-key': shortcut.toLowerCase(), 'aria-keyshortcuts': shortcut } : {};
}

function buttonClass({
  look = 'outlined',
  size = 'normal',
  className = '',
}: { [K in keyof Look]?: Look[K] | undefined }) {
  if (look === 'word') return `lw-word-button ${className}`;
  const looks = { primary: 'lw-btn-primary', outlined: '', stop: 'lw-btn-stop' };
  const sizes = { normal: '', small: 'lw-btn-small', big: 'lw-btn-big' };
  return `lw-btn ${looks[look]} ${sizes[size]} ${className}`;
}

/** Two clicks in one moment come before React draws the first: the ref refuses the second at once. */
function useHeldUntilDone() {
  const running = useRef(false);
  const [working, setWorking] = useState(false);

  const run = (work: () => void | Promise<unknown> | undefined) => {
    if (running.current) return;
    const outcome = work();
    if (!(outcome instanceof Promise)) return;
    running.current = true;
    setWorking(true);
    const release = () => {
      running.current = false;
      setWorking(false);
    };
    outcome.then(release, (reason: unknown) => {
      release();
      throw reason;
    });
  };
  return { working, run };
}
