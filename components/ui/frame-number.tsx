interface FrameNumberProps {
  number: number;
  /** A step of the processor's page: done in blue, late in red oxide. */
  state?: 'open' | 'done' | 'late';
}

/** The numbered square at the head of a step. */
export function StepNumber({ number, state = 'open' }: FrameNumberProps) {
  const states = {
    open: 'border-ink text-ink',
    done: 'border-proved-ink bg-proved-ink text-paper',
    late: 'border-held-ink text-held-ink',
  };
  return (
    <span
      className={`inline-flex size-6 flex-none items-center justify-center border-heavy font-mono text-sub leading-none ${states[state]}`}
    >
      {number}
      {state === 'done' && <span className="sr-only">, done</span>}
    </span>
  );
}

const FRAMES = [
  'border-[1.25px]',
  'border-[3px] border-double',
  'border-[3px] border-double outline-1 outline-offset-1 outline-ink',
];

/** Load 1 in a single frame, 2 in a double, 3 in a triple: it survives a bad copier. */
export function LoadNumber({ number }: { number: number }) {
  return (
    <span
      className={`inline-flex h-5 min-w-[22px] items-center justify-center border-ink px-0.5 font-mono text-[0.78rem] leading-none font-semibold ${
        FRAMES[number - 1] ?? 'border'
      }`}
    >
      {number}
    </span>
  );
}
