'use client';

import { useState } from 'react';
import { NumberField, type NumberHit } from '@/components/shell/number-field';
import { ScanSheet } from '@/components/shell/scan-sheet';
import { UnitsChoice } from '@/components/shell/units-choice';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextField } from '@/components/ui/field';
import { FileDrop } from '@/components/ui/file-drop';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { SegmentButtons } from '@/components/ui/segments';

const HITS: readonly NumberHit[] = [
  {
    kind: 'Batch',
    number: 'B-0404',
    says: 'Ostrow Heat Treating, at processor',
    href: '/dev/components?found=B-0404',
  },
  {
    kind: 'Batch',
    number: 'B-0407',
    says: 'Pell & Varga Plating, at processor',
    href: '/dev/components?found=B-0407',
  },
  { kind: 'Lot', number: 'L-0404', says: 'Chine angle, aft', href: '/dev/components?found=L-0404' },
];

async function search(text: string): Promise<readonly NumberHit[]> {
  return Promise.resolve(HITS.filter((hit) => hit.number.toLowerCase().includes(text.toLowerCase())));
}

export function DemoNumberField() {
  return <NumberField search={search} />;
}

export function DemoScan() {
  return <ScanSheet search={search} />;
}

export function DemoFileDrop() {
  const [names, setNames] = useState('');
  return (
    <FileDrop
      label="Certificate"
      hint={names || 'PDF or photo, up to 50 MB'}
      multiple
      onFiles={(files) => setNames(files.map((file) => file.name).join(', '))}
    />
  );
}

export function DemoLive() {
  const [open, setOpen] = useState(false);
  const [by, setBy] = useState<'all' | 'late' | 'mine'>('all');
  return (
    <Section title="Messages, dialog, choices">
      <div className="flex flex-wrap items-end gap-4 py-2">
        <Button
          onClick={() =>
            showMessage({ says: 'L-0242 added to load 1.', action: { says: 'Undo', run: () => undefined } })
          }
        >
          Add L-0242
        </Button>
        <Button
          look="stop"
          onClick={() =>
            showMessage({
              says: 'Not saved: Tobias changed line 3 at 09:14.',
              failed: true,
              action: { says: 'Show both', href: '#both' },
            })
          }
        >
          Fail to save
        </Button>
        <Button shortcut="O" onClick={() => setOpen(true)}>
          Override
        </Button>
        <SegmentButtons
          label="Show"
          value={by}
          onChange={setBy}
          options={[
            { value: 'all', says: 'all' },
            { value: 'late', says: 'late and held' },
            { value: 'mine', says: 'mine' },
          ]}
        />
        <UnitsChoice units="inch" onChoose={() => undefined} />
      </div>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        title="Override: line 5 ends in T3"
        lead="The blocker stays on the record with your name. It prints on the traveller."
        onSubmit={() => setOpen(false)}
        actions={
          <>
            <Button type="submit" look="primary">
              Override and keep the reason
            </Button>
            <Button onClick={() => setOpen(false)}>Leave it blocked</Button>
          </>
        }
      >
        <TextField label="Reason" hint="20 letters or more; the processor and the auditor read it" />
      </Dialog>
    </Section>
  );
}
