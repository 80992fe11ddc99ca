'use client';

import { Button } from '@/components/ui/button';
import { VerdictMark } from '@/components/ui/marks';
import { Progress } from '@/components/ui/progress';
import { sizeWords } from '@/lib/files/kinds';
import type { Upload } from './use-uploads';

interface UploadRowProps {
  upload: Upload;
  onAgain: () => void;
  onUseSame: (fileId: string) => Promise<void>;
  onRemove: () => void;
  removable: boolean;
}

export function UploadRow({ upload, onAgain, onUseSame, onRemove, removable }: UploadRowProps) {
  const { name, state, refusal } = upload;
  const sameAs = refusal?.sameAs ?? null;
  const isUnderWay = state === 'waiting' || state === 'sending' || state === 'checking';
  return (
    <li
      className={`border-b border-rule py-2 ${refusal ? 'border-l-4 border-l-held bg-held-wash px-3' : ''}`}
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
        <div className="min-w-0 flex-1 basis-60">
          <UploadState upload={upload} />
        </div>
        <div className="flex gap-4">
          {refusal?.mayTryAgain && (
            <Button look="word" aria-label={`Try ${name} again`} onClick={onAgain}>
              Try again
            </Button>
          )}
          {sameAs !== null && (
            <Button look="word" aria-label={`Use the ${name} that is here`} onClick={() => onUseSame(sameAs)}>
              Use that one
            </Button>
          )}
          {removable && (
            <Button
              look="word"
              aria-label={isUnderWay ? `Stop sending ${name}` : `Remove ${name}`}
              onClick={onRemove}
            >
              {isUnderWay ? 'Stop' : 'Remove'}
            </Button>
          )}
        </div>
      </div>
    </li>
  );
}

function UploadState({ upload }: { upload: Upload }) {
  const { name, size, state, sent, refusal } = upload;
  if (refusal) {
    return (
      <p role="alert" className="flex items-start gap-2 [overflow-wrap:anywhere]">
        <VerdictMark verdict="does_not_meet" size={14} className="mt-[3px] flex-none text-held-ink" />
        <span>{refusal.message}</span>
      </p>
    );
  }
  if (state === 'sending')
    return (
      <Progress
        says={`Sending ${name}`}
        value={sent}
        of={size}
        where={`${sizeWords(sent)} of ${sizeWords(size)}`}
      />
    );
  const words = {
    waiting: 'waits for the one before it',
    checking: 'sent; being read back',
    arrived: sizeWords(size),
    refused: '',
  }[state];
  return (
    <p
      className="flex items-start gap-2 [overflow-wrap:anywhere]"
      role={state === 'arrived' ? 'status' : undefined}
    >
      {state === 'arrived' && (
        <VerdictMark verdict="meets" size={14} className="mt-[3px] flex-none text-proved-ink" />
      )}
      <span>
        <strong>{name}</strong> <span className="text-quiet">{words}</span>
        {state === 'arrived' && <span className="sr-only"> has arrived</span>}
      </span>
    </p>
  );
}
