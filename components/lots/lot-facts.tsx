'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { Failing } from '@/components/ui/failing';
import { TextArea, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import { editLot, getLot, listLots, type Lot } from '@/lib/lots/contract';

/** What is written of the lot itself; corrected in place. */
export function LotFacts({ lot, mayEdit }: { lot: Lot; mayEdit: boolean }) {
  const clock = useClock();
  const [editing, setEditing] = useState(false);
  return (
    <Section
      title="The lot"
      action={
        mayEdit &&
        !editing && (
          <Button look="word" shortcut="E" onClick={() => setEditing(true)}>
            Correct
          </Button>
        )
      }
    >
      {editing ? (
        <FactsForm lot={lot} onDone={() => setEditing(false)} />
      ) : (
        <dl className="grid grid-cols-[6rem_minmax(0,1fr)] gap-x-3 gap-y-1.5 py-1.5 [overflow-wrap:anywhere]">
          <dt className="text-quiet">Heat</dt>
          <dd className="num">{lot.heat}</dd>
          <dt className="text-quiet">Made</dt>
          <dd>
            <Day day={lot.madeOn.slice(0, 10)} clock={clock} />
          </dd>
          <dt className="text-quiet">Pieces</dt>
          <dd>{lot.serialised ? 'each has its own serial' : 'not numbered'}</dd>
          {lot.note && (
            <>
              <dt className="text-quiet">Note</dt>
              <dd className="whitespace-pre-line">{lot.note}</dd>
            </>
          )}
        </dl>
      )}
    </Section>
  );
}

const Facts = editLot.input.pick({ heat: true, note: true });

function FactsForm({ lot, onDone }: { lot: Lot; onDone: () => void }) {
  const form = useForm({
    resolver: zodResolver(Facts),
    defaultValues: { heat: lot.heat, note: lot.note ?? '' },
  });
  const write = useWrite(editLot, { refreshes: [getLot, listLots] });
  const { errors } = form.formState;
  const save = form.handleSubmit((values) =>
    write
      .mutateAsync(
        {
          lotId: lot.id,
          version: lot.version,
          millCertificateFileId: lot.millCertificate?.id ?? null,
          ...values,
        },
        { onSuccess: onDone, onError: showOnForm(form) },
      )
      .then(
        () => undefined,
        () => undefined,
      ),
  );
  return (
    <form noValidate onSubmit={save} className="flex flex-col gap-3 py-2">
      {errors.root?.message && <Failing says={errors.root.message} />}
      <TextField label="Heat" mono error={errors.heat?.message} {...form.register('heat')} />
      <TextArea label="Note" error={errors.note?.message} {...form.register('note')} />
      <div className="flex gap-2.5">
        <Button type="submit" busy={write.isPending} busyLabel="Keeping">
          Keep the correction
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
}
