'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { useLazyRead, useWrite } from '@/components/api/use-api';
import { showOnForm } from '@/components/api/show-on-form';
import { FileUpload } from '@/components/files/file-upload';
import { useClock } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { DateField, NumberInput, TextArea, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { calendarDay } from '@/lib/day-words';
import { createLot, listLots, LotInput } from '@/lib/lots/contract';
import { serialsIn } from '@/lib/lots/import-row';
import { getPart } from '@/lib/parts/contract';
import { PartPicker, type PickedPart } from './part-picker';

interface Values {
  partId: string;
  heat: string;
  pieces: string;
  serials: string;
  madeOn: string;
  number: string;
  note: string;
  millCertificateFileId: string | null;
}

const NO_ID = '00000000-0000-0000-0000-000000000000';

/** A lot as it comes off the bench: which part, from which heat, how many. */
export function NewLot({ partId }: { partId: string | null }) {
  const { data: given } = useLazyRead(getPart, { partId: partId ?? NO_ID }, { enabled: partId !== null });
  const [picked, setPicked] = useState<PickedPart | null | undefined>(undefined);
  return (
    <>
      <PageHead title="A new lot" sub="Pieces of one part, made together from one heat." />
      <LotForm part={picked === undefined ? (given ?? null) : picked} onPick={setPicked} />
    </>
  );
}

function LotForm({ part, onPick }: { part: PickedPart | null; onPick: (part: PickedPart | null) => void }) {
  const router = useRouter();
  const clock = useClock();
  const create = useWrite(createLot, { refreshes: [listLots, getPart] });
  const form = useForm<Values>({
    defaultValues: {
      partId: '',
      heat: '',
      pieces: '',
      serials: '',
      madeOn: calendarDay(clock.now, clock.zone),
      number: '',
      note: '',
      millCertificateFileId: null,
    },
  });
  const { errors, isSubmitting } = form.formState;
  const [sending, setSending] = useState(false);
  const serials = serialsIn(useWatch({ control: form.control, name: 'serials' }));

  const submit = form.handleSubmit(async (values) => {
    const input = LotInput.safeParse(inputOf(values, part));
    const uncounted = part !== null && !part.serialised && values.pieces.trim() === '';
    if (!input.success || uncounted) {
      const wrong = new Map(
        (input.error?.issues ?? []).map(({ path, message }) => [String(path[0]), message]),
      );
      if (uncounted) wrong.set('pieces', 'Pieces are missing. Enter how many there are.');
      [...wrong].forEach(([field, message], at) =>
        form.setError(field as keyof Values, { message }, { shouldFocus: at === 0 }),
      );
      return;
    }
    await create
      .mutateAsync(input.data, {
        onError: showOnForm(form),
        onSuccess: (lot) => {
          showMessage({
            says: `${lot.number} added.`,
            action: { says: 'Add another', href: `/lots/new?part=${input.data.partId}` },
          });
          router.push(`/lots/${lot.id}`);
        },
      })
      .catch(() => undefined);
  });

  return (
    <form noValidate onSubmit={submit} className="max-w-[90rem]">
      {errors.root?.message && <Failing says={errors.root.message} stands="What you typed is kept here." />}
      <MainAndSide
        main={
          <Section title="The lot">
            <div className="flex flex-col gap-3 py-2">
              <PartPicker
                picked={part}
                onPick={(chosen) => {
                  form.clearErrors('partId');
                  onPick(chosen);
                }}
                error={errors.partId?.message}
              />
              <div className="grid grid-cols-4 gap-x-4 gap-y-3 max-md:grid-cols-2">
                <TextField
                  className="max-md:col-span-2"
                  label="Heat"
                  mono
                  autoComplete="off"
                  hint="from the mill certificate"
                  error={errors.heat?.message}
                  {...form.register('heat')}
                />
                {!part?.serialised && (
                  <NumberInput
                    label="Pieces"
                    inputMode="numeric"
                    unit="pc"
                    error={errors.pieces?.message}
                    {...form.register('pieces')}
                  />
                )}
                <DateField label="Made" error={errors.madeOn?.message} {...form.register('madeOn')} />
                <TextField
                  label="Lot number"
                  mono
                  autoComplete="off"
                  hint="empty: the next number"
                  error={errors.number?.message}
                  {...form.register('number')}
                />
              </div>
              {part?.serialised && (
                <TextArea
                  label="Serials"
                  rows={8}
                  hint={`one a line, or divided by commas; ${serials.length === 1 ? '1 piece' : `${serials.length} pieces`}`}
                  error={errors.serials?.message}
                  {...form.register('serials')}
                />
              )}
              <TextArea label="Note" rows={2} error={errors.note?.message} {...form.register('note')} />
            </div>
          </Section>
        }
        side={
          <Section title="Mill certificate" note="may come later">
            <FileUpload
              purpose="mill_certificate"
              label="Mill certificate of the heat"
              hint="PDF, PNG, JPEG or TIFF, at most 50 MB"
              onArrived={({ id }) => form.setValue('millCertificateFileId', id)}
              onRemoved={() => form.setValue('millCertificateFileId', null)}
              onUnderWay={setSending}
              error={errors.millCertificateFileId?.message}
            />
          </Section>
        }
      />
      <div className="mt-6 flex flex-wrap gap-2.5 border-t-heavy border-ink pt-4">
        <Button
          type="submit"
          look="primary"
          busy={isSubmitting}
          busyLabel="Adding"
          notNow={sending && 'The mill certificate is still on its way.'}
        >
          Add the lot
        </Button>
        <ButtonLink href="/lots">Leave without keeping</ButtonLink>
      </div>
    </form>
  );
}

/** Text that is no whole number stays text, so that the contract can say what is wrong with it. */
function inputOf(values: Values, part: PickedPart | null) {
  const pieces = values.pieces.trim();
  const counted = pieces === '' ? null : Number(pieces.replaceAll(/[\s,]/g, ''));
  return {
    ...values,
    partId: part?.id ?? '',
    pieces: part?.serialised ? null : counted,
    serials: part?.serialised ? serialsIn(values.serials) : [],
  };
}
