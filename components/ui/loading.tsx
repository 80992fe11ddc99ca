const WIDTHS = ['w-14', 'w-52', 'w-32', 'w-44', 'w-24'];

/** Bars where rows will stand; a wait under 300 ms shows nothing. */
export function Loading({ rows = 5, label = 'Loading' }: { rows?: number; label?: string }) {
  return (
    <div role="status" className="lw-after-300">
      <span className="sr-only">{label}</span>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} aria-hidden="true" className="flex h-[37px] items-center gap-6 border-b border-rule">
          <span className="lw-bar w-14 flex-none" />
          <span className={`lw-bar ${WIDTHS[(row + 1) % WIDTHS.length] ?? 'w-52'} max-w-[40%]`} />
          <span className={`lw-bar ml-auto ${WIDTHS[(row + 3) % WIDTHS.length] ?? 'w-24'} max-w-[20%]`} />
        </div>
      ))}
    </div>
  );
}
