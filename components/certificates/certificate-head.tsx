'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { DateField, TextField } from '@/components/ui/field';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import { RecordCertificate, recordCertificate } from '@/lib/certificates/prove-contract';

import { SetAsideForm } from './set-aside-form';
import type { Proving } from './use-proving';

/** Number and date as printed on it: kept when both are there, without a button to look for. */
export function CertificateHead({ proving }: { proving: Proving }) {
  const clock = useClock();
  const [asiding, setAsiding] = useState(false);
  const { certificate } = proving.data;
  const canEdit = proving.canEdit && certificate.state === 'waiting';
  return (
    <div className="border-t-heavy border-ink pt-2 pb-3">
      {canEdit ? (
        <NumberAndDate key={certificate.id} proving={proving} />
      ) : (
        <p>
          Certificate <strong className="num">{certificate.number ?? 'without number'}</strong>
          {certificate.datedOn && (
            <>
              {' of '}
              <Day day={certificate.datedOn} clock={clock} />
            </>
          )}
        </p>
      )}
      {canEdit && !asiding && (
        <Button look="word" onClick={() => setAsiding(true)}>
          Set this certificate aside
        </Button>
      )}
      {asiding && <SetAsideForm certificate={certificate} onDone={() => setAsiding(false)} />}
    </div>
  );
}

const Fields = RecordCertificate.pick({ number: true, datedOn: true });

function NumberAndDate({ proving }: { proving: Proving }) {
  const { certificate } = proving.data;
  const form = useForm({
    resolver: zodResolver(Fields),
    // What is confirmed as read elsewhere on the page comes in here, beside what is being typed.
    values: { number: certificate.number ?? '', datedOn: certificate.datedOn ?? '' },
    resetOptions: { keepDirtyValues: true },
  });
  const write = useWrite(recordCertificate, { refreshes: [getCertificate, listCertificates] });
  const { errors, isDirty } = form.formState;
  const keep = form.handleSubmit(async (values) => {
    await write
      .mutateAsync(
        { certificateId: certificate.id, version: certificate.version, ...values },
        { onError: showOnForm(form), onSuccess: () => form.reset(values) },
      )
      .catch(() => undefined);
  });
  const keepWhenWhole = () => {
    const { number, datedOn } = form.getValues();
    if (isDirty && number.trim() !== '' && datedOn !== '' && !write.isPending) void keep();
  };
  return (
    <form noValidate onSubmit={keep} onBlur={keepWhenWhole} className="flex flex-wrap items-start gap-3">
      <TextField
        className="w-56 max-md:w-full"
        label="Certificate number"
        mono
        error={errors.number?.message}
        {...form.register('number')}
      />
      <DateField
        className="w-44 max-md:w-full"
        label="Date on it"
        error={errors.datedOn?.message}
        {...form.register('datedOn')}
      />
      <span className="pt-[30px] text-second text-quiet max-md:pt-0" role="status">
        {errors.root?.message ??
          savedWords({ isDirty, isPending: write.isPending, isThere: certificate.number !== null })}
      </span>
    </form>
  );
}

function savedWords({
  isDirty,
  isPending,
  isThere,
}: {
  isDirty: boolean;
  isPending: boolean;
  isThere: boolean;
}): string {
  if (isPending) return 'Keeping';
  if (isDirty) return 'not kept yet';
  return isThere ? 'kept' : 'as printed on it';
}
