'use client';

import { useEffect, type ReactNode } from 'react';
import { FileDrop } from '@/components/ui/file-drop';
import { acceptedFiles } from '@/lib/files/kinds';
import type { FileView } from '@/lib/files/contract';
import type { FilePurpose } from '@/lib/files/purpose';
import { UploadRow } from './upload-row';
import { useUploads } from './use-uploads';

interface FileUploadProps {
  purpose: FilePurpose;
  /** The batch it belongs to, for everything but drawings and mill certificates. */
  batchId?: string;
  label: ReactNode;
  hint?: ReactNode;
  multiple?: boolean;
  /** Opens the camera of a phone at once. */
  camera?: boolean;
  /** Each file that has arrived and counts. */
  onArrived: (file: FileView) => void;
  /** An arrived file that is taken off the list again; without it, arrived files stay. */
  onRemoved?: (file: FileView) => void;
  /** Whether files are still on their way: a form that was sent now would leave without them. */
  onUnderWay?: (isUnderWay: boolean) => void;
  /** What the form that takes the file says against it. */
  error?: string | undefined;
}

/** Drop, choose or photograph; then see each file on its way, and what became of it. */
export function FileUpload({
  purpose,
  batchId,
  label,
  hint,
  multiple = false,
  camera = false,
  onArrived,
  onRemoved,
  onUnderWay,
  error,
}: FileUploadProps) {
  const { uploads, add, again, takeSame, remove } = useUploads(
    { purpose, ...(batchId === undefined ? {} : { batchId }) },
    onArrived,
  );
  const isUnderWay = uploads.some(({ state }) => state !== 'arrived' && state !== 'refused');
  useEffect(() => onUnderWay?.(isUnderWay), [isUnderWay, onUnderWay]);
  const takes = multiple || uploads.every(({ state }) => state === 'refused');

  return (
    <div className="min-w-0">
      {takes && (
        <FileDrop
          label={label}
          hint={hint}
          error={error}
          multiple={multiple}
          camera={camera}
          accept={acceptedFiles(purpose)}
          onFiles={add}
        />
      )}
      {uploads.length > 0 && (
        <ul aria-label="Files being sent" className="mt-2">
          {uploads.map((upload) => (
            <UploadRow
              key={upload.key}
              upload={upload}
              onAgain={() => again(upload.key)}
              onUseSame={(fileId) => takeSame(upload.key, fileId)}
              onRemove={() => {
                remove(upload.key);
                if (upload.file) onRemoved?.(upload.file);
              }}
              removable={upload.state !== 'arrived' || onRemoved !== undefined}
            />
          ))}
        </ul>
      )}
    </div>
  );
}
