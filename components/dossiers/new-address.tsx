'use client';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { TextField } from '@/components/ui/field';

/** The address of a new link. Only its hash is kept, so it is shown this once. */
export function NewAddress({ url, forWhom }: { url: string; forWhom: string }) {
  const [copied, setCopied] = useState<'no' | 'yes' | 'by hand'>('no');
  const copy = () =>
    navigator.clipboard.writeText(url).then(
      () => setCopied('yes'),
      () => setCopied('by hand'),
    );
  return (
    <Edge level="note">
      <div role="status">
        <strong>The link for {forWhom} is made.</strong> Copy it now: it is not shown again, because only its
        fingerprint is kept.
      </div>
      <div className="flex flex-wrap items-end gap-2 pt-2">
        <TextField
          label="Address"
          className="min-w-0 flex-1 basis-64"
          mono
          readOnly
          value={url}
          onFocus={(event) => event.currentTarget.select()}
        />
        <Button onClick={copy}>{copied === 'yes' ? 'Copied' : 'Copy it'}</Button>
      </div>
      {copied === 'by hand' && (
        <p className="pt-1 text-second text-dispatched-ink">
          The browser does not let us copy. Select the address and copy it by hand.
        </p>
      )}
    </Edge>
  );
}
