'use client';

import { useState } from 'react';
import { useWrite } from '@/components/api/use-api';
import { FileLink } from '@/components/files/file-link';
import { FileUpload } from '@/components/files/file-upload';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { editLot, getLot, listLots, type Lot } from '@/lib/lots/contract';

/** The paper that says what the metal is. Added when it comes; a better copy takes its place and the first is kept. */
export function MillCertificate({ lot, mayEdit }: { lot: Lot; mayEdit: boolean }) {
  const [replacing, setReplacing] = useState(false);
  const [refusal, setRefusal] = useState<string>();
  const edit = useWrite(editLot, { refreshes: [getLot, listLots] });
  const file = lot.millCertificate;

  const take = async (fileId: string, name: string) => {
    setRefusal(undefined);
    await edit
      .mutateAsync(
        {
          lotId: lot.id,
          version: lot.version,
          heat: lot.heat,
          note: lot.note ?? '',
          millCertificateFileId: fileId,
        },
        {
          onSuccess: () => {
            setReplacing(false);
            showMessage({ says: `${name} is the mill certificate of ${lot.number}.` });
          },
          onError: (error) => setRefusal(error.problem.title),
        },
      )
      .catch(() => undefined);
  };

  return (
    <Section
      title="Mill certificate"
      action={
        file &&
        mayEdit && (
          <Button look="word" onClick={() => setReplacing(!replacing)}>
            {replacing ? 'Leave it' : 'Replace'}
          </Button>
        )
      }
    >
      {file ? (
        <FileLink file={file} className="block py-2" />
      ) : (
        <p className="py-2 text-dispatched-ink">
          None yet for heat <span className="num">{lot.heat}</span>.
        </p>
      )}
      {mayEdit && (!file || replacing) && (
        <FileUpload
          purpose="mill_certificate"
          label={file ? 'A better copy' : 'Add the mill certificate'}
          hint="PDF, PNG, JPEG or TIFF, at most 50 MB"
          onArrived={(arrived) => void take(arrived.id, arrived.name)}
          error={refusal}
        />
      )}
    </Section>
  );
}
