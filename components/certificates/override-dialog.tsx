'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import type { ProvedRequirement } from '@/lib/certificates/contract';
import { DecideRequirement } from '@/lib/certificates/prove-contract';
import { limitWords } from '@/lib/parts/limit-words';

import type { Proving } from './use-proving';

const Reason = z.object({ reason: DecideRequirement.shape.overrideReason.unwrap().unwrap() });

/** Accepting against the verdict is nothing one does in passing. */
export function OverrideDialog({
  requirement,
  proving,
}: {
  requirement: ProvedRequirement;
  proving: Proving;
}) {
  const [open, setOpen] = useState(false);
  const form = useForm({
    resolver: zodResolver(Reason),
    defaultValues: { reason: requirement.decision?.overrideReason ?? '' },
  });
  const { decision } = requirement;
  if (!decision) return null;
  const override = form.handleSubmit(async ({ reason }) => {
    await proving.decide(requirement, { verdict: decision.verdict, overrideReason: reason });
    setOpen(false);
    proving.onward(requirement.id);
  });
  return (
    <>
      <Button size="small" shortcut="O" onClick={() => setOpen(true)}>
        Override
      </Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        title={`Override: ${requirement.characteristic} ${limitWords(requirement)}`}
        lead="The verdict stays on the record with your name and reason, and is sealed by the signature."
        busy={form.formState.isSubmitting}
        onSubmit={override}
        actions={
          <>
            <Button
              look="primary"
              type="submit"
              busy={form.formState.isSubmitting}
              busyLabel="Keeping the reason"
            >
              Override and keep the reason
            </Button>
            <Button onClick={() => setOpen(false)}>Leave it not met</Button>
          </>
        }
      >
        <TextArea
          label="Reason"
          hint="20 letters or more: the processor and the auditor read it."
          error={form.formState.errors.reason?.message}
          {...form.register('reason')}
        />
      </Dialog>
    </>
  );
}
