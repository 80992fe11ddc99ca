'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FileUpload } from '@/components/files/file-upload';
import { Button } from '@/components/ui/button';
import { CheckboxGroup, RadioGroup } from '@/components/ui/choice';
import { Dialog } from '@/components/ui/dialog';
import { TextArea, TextField } from '@/components/ui/field';
import { list, piecesField } from '@/components/ui/form-fields';
import { showMessage } from '@/components/ui/message';
import { PieceCounter } from '@/components/ui/piece-counter';
import { allowedDispositions, ruleOf } from '@/lib/nonconformances/allowed-dispositions';
import {
  disposeNonconformance,
  getNonconformance,
  listNonconformances,
  type NonconformanceDetail,
} from '@/lib/nonconformances/contract';
import { DISPOSITIONS, type Disposition } from '@/lib/nonconformances/disposition';
import { faultsOfDisposition } from '@/lib/nonconformances/faults-of-disposition';

import { buttonWords, choiceOf } from './disposition-words';

const Fields = z.object({
  disposition: z.enum(DISPOSITIONS, 'Choose what becomes of the pieces.'),
  pieces: piecesField('Pieces').pipe(z.number().min(1, 'Enter 1 or more.')),
  authority: z.string().trim().max(200, 'Write 200 characters or less.'),
  fileId: z.string().nullable(),
  reason: z.string().trim().min(1, 'Say why.').max(500, 'Write 500 characters or less.'),
  pieceIds: list(z.string()),
});
type FieldsIn = z.input<typeof Fields>;
type FieldsOut = z.output<typeof Fields>;

/** Everything that is missing is said at once. How many are still away only the server knows. */
const fieldsOf = ({ kind, serialised, pieces, decided }: NonconformanceDetail) =>
  Fields.superRefine((values, ctx) => {
    const about = { kind, serialised, left: pieces - decided, away: pieces };
    for (const { field, message } of faultsOfDisposition(values, about))
      ctx.addIssue({ code: 'custom', path: [field], message });
  });

/** Decides about some or all of the pieces that are left. */
export function DispositionForm({ nonconformance }: { nonconformance: NonconformanceDetail }) {
  const { id, kind, version, serialised, heldPieces } = nonconformance;
  const left = nonconformance.pieces - nonconformance.decided;
  const [sending, setSending] = useState(false);
  const [asking, setAsking] = useState<FieldsOut | null>(null);
  const form = useForm<FieldsIn, unknown, FieldsOut>({
    resolver: zodResolver(fieldsOf(nonconformance)),
    defaultValues: { pieces: String(left), reason: '', authority: '', fileId: null, pieceIds: [] },
  });
  const write = useWrite(disposeNonconformance, { refreshes: [getNonconformance, listNonconformances] });
  const [disposition, pieces] = useWatch({ control: form.control, name: ['disposition', 'pieces'] });
  const rule = ruleOf(kind, disposition);
  const { errors, isSubmitting } = form.formState;

  const decide = async (values: FieldsOut) => {
    const pieceIds = serialised && rule?.to !== null ? values.pieceIds : [];
    const done = await write
      .mutateAsync(
        {
          nonconformanceId: id,
          version,
          ...values,
          pieceIds,
          authority: rule?.authority ? values.authority : '',
          fileId: rule?.file ? values.fileId : null,
        },
        { onError: showOnForm(form) },
      )
      .catch(() => null);
    setAsking(null);
    if (done)
      showMessage({
        says: done.closed
          ? `${nonconformance.number} is closed.`
          : `Decided about ${values.pieces}, ${done.left} left.`,
      });
  };
  const submit = form.handleSubmit((values) =>
    values.disposition === 'scrap' ? setAsking(values) : decide(values),
  );
  const words = (count: string) => buttonWords(kind, disposition, count);

  return (
    <form
      noValidate
      onSubmit={submit}
      aria-label="Disposition"
      className="flex max-w-prose flex-col gap-4 py-2"
    >
      <RadioGroup
        label="What becomes of them"
        error={errors.disposition?.message}
        options={allowedDispositions(kind).map((value) => ({ value, ...choiceOf(kind, value) }))}
        {...form.register('disposition')}
      />
      <PieceCounter
        {...form.register('pieces')}
        className="w-52"
        label="Pieces"
        hint={`${left} left to decide`}
        min={1}
        max={left}
        error={errors.pieces?.message}
      />
      {serialised && rule?.to != null && (
        <CheckboxGroup
          label="Which pieces"
          error={errors.pieceIds?.message}
          options={heldPieces.map((piece) => ({
            value: piece.id,
            says: <span className="num">{piece.serial}</span>,
          }))}
          {...form.register('pieceIds')}
        />
      )}
      {rule?.authority && (
        <TextField
          label="Who allows it, and by which paper"
          hint="The engineer or the customer, by name and number of the paper"
          error={errors.authority?.message}
          {...form.register('authority')}
        />
      )}
      {rule?.file && (
        <FileUpload
          purpose="concession"
          batchId={nonconformance.batchId}
          label="The concession"
          hint="PDF or picture, up to 50 MB"
          onArrived={(file) =>
            form.setValue('fileId', file.id, { shouldValidate: form.formState.isSubmitted })
          }
          onRemoved={() => form.setValue('fileId', null)}
          onUnderWay={setSending}
          error={errors.fileId?.message}
        />
      )}
      <TextArea label="Reason" rows={2} error={errors.reason?.message} {...form.register('reason')} />
      {errors.root?.message && (
        <p role="alert" className="font-medium text-held-ink">
          {errors.root.message}
        </p>
      )}
      <span>
        <Button
          look="primary"
          type="submit"
          busy={isSubmitting || write.isPending}
          busyLabel="Deciding"
          notNow={
            (!isDisposition(disposition) && 'Choose first what becomes of them.') ||
            (sending && 'The paper is still on its way.')
          }
        >
          {isDisposition(disposition) ? words(String(pieces)) : 'Decide'}
        </Button>
      </span>
      <Dialog
        open={asking !== null}
        onClose={() => setAsking(null)}
        busy={write.isPending}
        title={asking ? `${words(String(asking.pieces))}, ${nonconformance.partNumber}` : ''}
        lead={
          kind === 'short'
            ? 'They leave the count as lost. This cannot be taken back.'
            : 'They leave the count for good. This cannot be taken back.'
        }
        actions={
          <>
            <Button
              look="stop"
              busy={write.isPending}
              busyLabel="Deciding"
              onClick={() => (asking ? decide(asking) : undefined)}
            >
              {asking && words(String(asking.pieces))}
            </Button>
            <Button onClick={() => setAsking(null)}>Leave them on hold</Button>
          </>
        }
      />
    </form>
  );
}

/** Nothing is chosen at first, whatever the type of the form says. */
const isDisposition = (value: Disposition | null | undefined): value is Disposition =>
  value != null && DISPOSITIONS.includes(value);
