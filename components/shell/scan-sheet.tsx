'use client';

import { type ReactNode, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { CameraScan } from './camera-scan';
import { NumberField, type NumberHit } from './number-field';
import { useRouter } from 'next/navigation';

interface ScanSheetProps {
  search: (text: string) => Promise<readonly NumberHit[]>;
  children?: ReactNode;
}

/** The dark cell of the bottom bar: the camera, and a field for a code that cannot be read. */
export function ScanSheet({ search, children = 'Scan a tag' }: ScanSheetProps) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const [unknown, setUnknown] = useState('');

  const read = async (code: string) => {
    const hits = await search(code).catch((): readonly NumberHit[] => []);
    const first = hits[0];
    if (!first) return setUnknown(code);
    setOpen(false);
    router.push(first.href);
  };

  return (
    <>
      <button
        type="button"
        className="bg-ink font-cond text-sub text-paper focus-visible:z-10"
        onClick={() => setOpen(true)}
      >
        {children}
      </button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        title="Scan a tag"
        actions={<Button onClick={() => setOpen(false)}>Close</Button>}
      >
        <div className="flex min-h-64 flex-col gap-3">
          <CameraScan onCode={(code) => void read(code)} />
          {unknown && <p role="status">The code says {unknown}. Nothing here has that number.</p>}
          <NumberField search={search} takesScans={false} onOpened={() => setOpen(false)} />
        </div>
      </Dialog>
    </>
  );
}
