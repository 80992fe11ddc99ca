'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { Dialog } from '@/components/ui/dialog';
import { NumberInput, TextField } from '@/components/ui/field';
import { piecesField } from '@/components/ui/form-fields';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import type { OutputOf } from '@/lib/api/endpoint';
import { calendarDay } from '@/lib/day-words';
import { getDossier, shareDossier, withdrawDossierLink } from '@/lib/dossiers/contract';

import { NewAddress } from './new-address';

type Link = OutputOf<typeof getDossier>['links'][number];

const Share = z.object({
  forWhom: z.string().trim().min(2, 'Say for whom it is.').max(120, 'Write 120 characters or less.'),
  days: piecesField('Days').pipe(z.number().min(1, 'At least 1 day.').max(366, 'At most 366 days.')),
});

/** Who outside may read this dossier, and until when. */
export function DossierLinks({ lotId, links }: { lotId: string; links: readonly Link[] }) {
  const mayShare = useMay('dossier.share');
  const [made, setMade] = useState<{ url: string; forWhom: string } | null>(null);
  return (
    <Section title="Links for people outside" note="read only, no password">
      {made && <NewAddress {...made} />}
      {mayShare && <ShareForm lotId={lotId} onMade={setMade} />}
      {links.length === 0 && (
        <p className="py-2 text-quiet">
          No link is given out.{!mayShare && ' Inspectors and admins give them out.'}
        </p>
      )}
      {links.length > 0 && (
        <ul aria-label="Links given out">
          {links.map((link) => (
            <LinkLine key={link.id} link={link} mayWithdraw={mayShare} />
          ))}
        </ul>
      )}
    </Section>
  );
}

function ShareForm({
  lotId,
  onMade,
}: {
  lotId: string;
  onMade: (made: { url: string; forWhom: string }) => void;
}) {
  const write = useWrite(shareDossier, { refreshes: [getDossier] });
  const form = useForm<z.input<typeof Share>, unknown, z.output<typeof Share>>({
    resolver: zodResolver(Share),
    defaultValues: { forWhom: '', days: '30' },
  });
  const { errors } = form.formState;
  const share = form.handleSubmit(async (typed) => {
    const done = await write
      .mutateAsync({ lotId, ...typed }, { onError: showOnForm(form) })
      .catch(() => null);
    if (!done) return;
    onMade({ url: done.url, forWhom: typed.forWhom });
    form.reset();
  });
  return (
    <form noValidate onSubmit={share} aria-label="Make a link" className="pb-3">
      <div className="flex flex-wrap items-start gap-x-3 gap-y-2">
        <TextField
          label="For whom"
          hint="Stands on the page they see"
          className="min-w-48 flex-1"
          autoComplete="off"
          error={errors.forWhom?.message}
          {...form.register('forWhom')}
        />
        <NumberInput
          label="For how long"
          unit="days"
          inputMode="numeric"
          className="w-32"
          error={errors.days?.message}
          {...form.register('days')}
        />
      </div>
      <div className="pt-2">
        <Button type="submit" busy={write.isPending} busyLabel="Making the link">
          Make a link
        </Button>
      </div>
      {errors.root && (
        <p role="alert" className="pt-2 font-medium text-held-ink">
          {errors.root.message}
        </p>
      )}
    </form>
  );
}

function LinkLine({ link, mayWithdraw }: { link: Link; mayWithdraw: boolean }) {
  const clock = useClock();
  const hasEnded = new Date(link.expiresAt) <= clock.now;
  const isOpen = link.withdrawnAt === null && !hasEnded;
  return (
    <li
      className={`flex flex-wrap items-baseline gap-x-4 border-b border-rule py-2 ${isOpen ? '' : 'text-faint'}`}
    >
      <span className="min-w-0 flex-1">
        <strong className={isOpen ? '' : 'font-normal'}>{link.forWhom}</strong>{' '}
        <span className="block text-second text-quiet">
          {link.withdrawnAt !== null && (
            <>
              withdrawn <Day day={calendarDay(new Date(link.withdrawnAt), clock.zone)} clock={clock} />
            </>
          )}
          {link.withdrawnAt === null && (
            <>
              {hasEnded ? 'ended' : 'until'}{' '}
              <Day day={calendarDay(new Date(link.expiresAt), clock.zone)} clock={clock} />
            </>
          )}
          , given out by {link.createdBy}
        </span>
      </span>
      {isOpen && mayWithdraw && <WithdrawLink link={link} />}
    </li>
  );
}

function WithdrawLink({ link }: { link: Link }) {
  const [open, setOpen] = useState(false);
  const write = useWrite(withdrawDossierLink, { refreshes: [getDossier] });
  const withdraw = () =>
    write.mutateAsync({ linkId: link.id }).then(
      () => {
        setOpen(false);
        showMessage({ says: `The link for ${link.forWhom} is withdrawn.` });
      },
      (error: unknown) =>
        showMessage({ says: error instanceof Error ? error.message : 'It was not withdrawn.', failed: true }),
    );
  return (
    <>
      <Button look="word" onClick={() => setOpen(true)}>
        Withdraw<span className="sr-only"> the link for {link.forWhom}</span>
      </Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        busy={write.isPending}
        title={`Withdraw the link for ${link.forWhom}`}
        lead="Whoever opens it from now on reads that you withdrew it. It cannot be opened again; a new one can be made."
        onSubmit={withdraw}
        actions={
          <>
            <Button look="stop" type="submit" busy={write.isPending} busyLabel="Withdrawing">
              Withdraw the link
            </Button>
            <Button onClick={() => setOpen(false)}>Leave it open</Button>
          </>
        }
      />
    </>
  );
}
