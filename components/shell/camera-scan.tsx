'use client';

import { useEffect, useRef, useState } from 'react';

/** Not yet in the type library of the browser. */
interface BarcodeReader {
  detect: (source: HTMLVideoElement) => Promise<{ rawValue: string }[]>;
}
interface BarcodeReaderKind {
  new (options: { formats: string[] }): BarcodeReader;
}
declare global {
  interface Window {
    BarcodeDetector?: BarcodeReaderKind;
  }
}

const LOOK_EVERY_MS = 200;

type State = 'starting' | 'looking' | 'no_reader' | 'no_camera';

/** Looks through the camera for a code, where the device can read one by itself. */
export function CameraScan({ onCode }: { onCode: (code: string) => void }) {
  const video = useRef<HTMLVideoElement>(null);
  const [state, setState] = useState<State>('starting');
  const report = useRef(onCode);
  useEffect(() => {
    report.current = onCode;
  });

  useEffect(() => {
    const abort = new AbortController();
    void look(video.current, abort.signal, setState, (code) => report.current(code));
    return () => abort.abort();
  }, []);

  return (
    <>
      <video
        ref={video}
        muted
        playsInline
        hidden={state !== 'looking'}
        className="aspect-square w-full bg-deep object-cover"
        aria-label="What the camera sees"
      />
      {state === 'no_reader' && (
        <p>This device cannot read codes by itself. Type the number under the code.</p>
      )}
      {state === 'no_camera' && (
        <p>The camera did not open. Allow it for this page, or type the number under the code.</p>
      )}
    </>
  );
}

async function look(
  element: HTMLVideoElement | null,
  signal: AbortSignal,
  tell: (state: State) => void,
  report: (code: string) => void,
) {
  if (!window.BarcodeDetector || !element) return tell('no_reader');
  const reader = new window.BarcodeDetector({ formats: ['qr_code', 'data_matrix', 'code_128'] });
  let stream: MediaStream;
  try {
    stream = await navigator.mediaDevices.getUserMedia({ video: { facingMode: 'environment' } });
  } catch {
    return tell('no_camera');
  }
  const stop = () => stream.getTracks().forEach((track) => track.stop());
  if (signal.aborted) return stop();
  signal.addEventListener('abort', stop);
  element.srcObject = stream;
  tell('looking');
  await element.play().catch(() => undefined);

  let last = '';
  while (!signal.aborted) {
    const [code] = await reader.detect(element).catch(() => []);
    if (code && code.rawValue !== last) {
      last = code.rawValue;
      report(last);
    }
    await new Promise((resume) => setTimeout(resume, LOOK_EVERY_MS));
  }
}
