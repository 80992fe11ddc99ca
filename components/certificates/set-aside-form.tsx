'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { call } from '@/lib/api/client';
import { getCertificate, listCertificates, type CertificateDetail } from '@/lib/certificates/contract';
import { setAsideCertificate, takeUpCertificate } from '@/lib/certificates/prove-contract';

const Reason = setAsideCertificate.input.pick({ reason: true });
const USUAL = ['Second copy', 'Replaced by a corrected one', 'Of another batch'];

/** The file stays as it was received. Taken back at once if it was a slip. */
export function SetAsideForm({
  certificate,
  onDone,
}: {
  certificate: CertificateDetail['certificate'];
  onDone: () => void;
}) {
  const form = useForm({ resolver: zodResolver(Reason), defaultValues: { reason: '' } });
  const refreshes = [getCertificate, listCertificates];
  const write = useWrite(setAsideCertificate, { refreshes });
  const undo = useWrite(takeUpCertificate, { refreshes });
  const submit = form.handleSubmit(async ({ reason }) => {
    const done = await write
      .mutateAsync(
        { certificateId: certificate.id, version: certificate.version, reason },
        { onError: showOnForm(form) },
      )
      .catch(() => null);
    if (!done) return;
    onDone();
    const back = { certificateId: certificate.id, version: done.version };
    // The message outlives this form, so it does not lean on the form's own write where that is gone.
    showMessage({
      says: 'Set aside. The file stays as it was received.',
      action: {
        says: 'Undo',
        run: () => undo.mutateAsync(back).catch(() => call(takeUpCertificate, back).catch(() => undefined)),
      },
    });
  });
  const { errors, isSubmitting } = form.formState;
  return (
    <form noValidate onSubmit={submit} className="flex flex-wrap items-end gap-2 pt-2">
      <TextField
        className="min-w-60 flex-1"
        label="Why it is set aside"
        list="set-aside-reasons"
        autoFocus
        error={errors.reason?.message ?? errors.root?.message}
        {...form.register('reason')}
      />
      <datalist id="set-aside-reasons">
        {USUAL.map((reason) => (
          <option key={reason} value={reason} />
        ))}
      </datalist>
      <Button type="submit" busy={isSubmitting} busyLabel="Setting aside">
        Set aside
      </Button>
      <Button onClick={onDone}>Keep it here</Button>
    </form>
  );
}
