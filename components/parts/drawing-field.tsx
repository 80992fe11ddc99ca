'use client';

import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { FileLink } from '@/components/files/file-link';
import { FileUpload } from '@/components/files/file-upload';
import { Button } from '@/components/ui/button';
import { Section } from '@/components/ui/section';
import type { PartValues } from './part-form-values';

/** The drawing counts for the part with the rest of the form; until then it is only kept. */
export function DrawingField({
  name,
  onUnderWay,
}: {
  name?: string | undefined;
  onUnderWay: (isUnderWay: boolean) => void;
}) {
  const { setValue, control, formState } = useFormContext<PartValues>();
  const drawingFileId = useWatch({ control, name: 'drawingFileId' });
  const [first] = useState(drawingFileId);
  const choose = (fileId: string | null) => setValue('drawingFileId', fileId, { shouldDirty: true });
  const isFirst = typeof drawingFileId === 'string' && drawingFileId === first;

  return (
    <Section
      title="Drawing"
      action={
        isFirst && (
          <Button look="word" onClick={() => choose(null)}>
            Replace
          </Button>
        )
      }
    >
      {isFirst ? (
        <FileLink file={{ id: drawingFileId, name: name ?? 'Drawing' }} className="block py-2" />
      ) : (
        <FileUpload
          purpose="drawing"
          label="Drawing of this revision"
          hint="PDF, PNG, JPEG or TIFF, at most 50 MB"
          onArrived={({ id }) => choose(id)}
          onRemoved={() => choose(null)}
          onUnderWay={onUnderWay}
          error={formState.errors.drawingFileId?.message}
        />
      )}
    </Section>
  );
}
