'use client';

import { type ChangeEvent, type DragEvent, type ReactNode, useId, useRef, useState } from 'react';
import { FieldError } from './field';

interface FileDropProps {
  label: ReactNode;
  onFiles: (files: File[]) => void;
  hint?: ReactNode;
  error?: string | undefined;
  /** As in an input: ".pdf,image/*". */
  accept?: string;
  multiple?: boolean;
  /** Opens the camera of a phone at once. */
  camera?: boolean;
  disabled?: boolean;
  className?: string;
}

export function FileDrop({
  label,
  onFiles,
  hint,
  error,
  accept,
  multiple,
  camera,
  disabled,
  className = '',
}: FileDropProps) {
  const id = useId();
  const [over, setOver] = useState(false);
  const depth = useRef(0);
  const takesPhotos = accept === undefined || accept.includes('image');

  const take = (files: FileList | null) => {
    const list = [...(files ?? [])];
    if (list.length > 0) onFiles(multiple ? list : list.slice(0, 1));
  };
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    take(event.currentTarget.files);
    // The same file may be chosen again after a fault was put right.
    event.currentTarget.value = '';
  };
  const drag = (event: DragEvent, by: number) => {
    event.preventDefault();
    depth.current += by;
    setOver(depth.current > 0);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    depth.current = 0;
    setOver(false);
    if (!disabled) take(event.dataTransfer.files);
  };

  return (
    <div className={`flex min-w-0 flex-col gap-1.5 ${className}`}>
      <label htmlFor={id} className="font-cond text-word leading-[1.125rem]">
        {label}
      </label>
      <div
        onDragEnter={(event) => drag(event, 1)}
        onDragLeave={(event) => drag(event, -1)}
        onDragOver={(event) => event.preventDefault()}
        onDrop={drop}
        className={`relative flex min-h-12 items-center border-heavy border-dashed px-3.5 py-2 text-quiet focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-focus ${
          over ? 'border-ink bg-bench' : 'border-line'
        } ${error ? 'border-held-ink' : ''}`}
      >
        <input
          id={id}
          type="file"
          accept={accept}
          multiple={multiple}
          disabled={disabled}
          capture={camera ? 'environment' : undefined}
          onChange={choose}
          aria-describedby={error ? `${id}-error` : `${id}-hint`}
          aria-invalid={error ? true : undefined}
          className="absolute inset-0 cursor-pointer opacity-0"
        />
        <span aria-hidden="true">
          Drop {multiple ? 'files' : 'a file'}
          {takesPhotos && ', take a photo'}, or <span className="lw-word-button text-ink">choose</span>
        </span>
      </div>
      {error ? (
        <FieldError id={`${id}-error`} says={error} />
      ) : (
        <span id={`${id}-hint`} className="text-source text-quiet">
          {hint}
        </span>
      )}
    </div>
  );
}
