'use client';

import Link from 'next/link';
import { type ReactNode, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Checkbox, RadioGroup } from '@/components/ui/choice';
import type { Look } from './look';
import { keepLook, keepSingleKeys } from './preferences';

export interface PersonPanelProps {
  look: Look;
  singleKeys: boolean;
  /** Where one's own account is kept. */
  accountHref: string;
  /** An address that takes a POST, or a server action. */
  signOut: string | (() => Promise<void>);
  /** More choices of this person, as `<UnitsChoice>`. */
  extra?: ReactNode;
}

const LOOK_WORDS = [
  { value: 'day', says: 'Day' },
  { value: 'night', says: 'Night shift' },
  { value: 'device', says: 'As this device' },
] as const;

export function PersonPanel({ look, singleKeys, accountHref, signOut, extra }: PersonPanelProps) {
  const [chosen, setChosen] = useState(look);

  const chooseLook = (value: string) => {
    const next = LOOK_WORDS.find((word) => word.value === value)?.value ?? 'device';
    setChosen(next);
    keepLook(next);
  };

  return (
    <div className="flex flex-col gap-3">
      <RadioGroup
        label="Light"
        options={LOOK_WORDS}
        chosen={[chosen]}
        onChange={(event) => chooseLook(event.currentTarget.value)}
      />
      <Checkbox
        says="Single keys"
        note="J, K, G and others; ? lists them"
        defaultChecked={singleKeys}
        onChange={(event) => keepSingleKeys(event.currentTarget.checked)}
      />
      {extra}
      <div className="flex flex-wrap items-center gap-x-5 border-t border-rule pt-3">
        <Link href={accountHref} className="lw-word-button">
          My account
        </Link>
        <form
          action={signOut}
          {...(typeof signOut === 'string' ? { method: 'post' } : {})}
          className="ml-auto"
        >
          <Button type="submit" size="small">
            Sign out
          </Button>
        </form>
      </div>
    </div>
  );
}
