import type { Tideline } from '@/lib/tideline/contract';
import { daysLate } from '@/lib/tideline/lateness';

/** `9 batches out, 355 pieces: 3 late, 1 without a date. 5 back, not yet in stock: 1 held.` */
export function Summary({ tideline }: { tideline: Tideline }) {
  const { batches, today, latenessBasis } = tideline;
  const out = batches.filter((batch) => ['dispatched', 'at_processor'].includes(batch.stage));
  const late = batches.filter((batch) => daysLate(batch, today, latenessBasis) > 0).length;
  const undated = out.filter((batch) => batch.promisedOn === null).length;
  const back = batches.filter((batch) => ['returned', 'proved', 'settled', 'held'].includes(batch.stage));
  const held = back.filter((batch) => batch.stage === 'held').length;
  const pieces = out.reduce((sum, batch) => sum + batch.pieces, 0);
  return (
    <p className="text-second text-quiet">
      <strong>{out.length}</strong> {out.length === 1 ? 'batch' : 'batches'} out,{' '}
      <strong>{pieces.toLocaleString('en-US')}</strong> pieces
      {(late > 0 || undated > 0) && ': '}
      {late > 0 && <strong className="text-held-ink">{late} late</strong>}
      {late > 0 && undated > 0 && ', '}
      {undated > 0 && `${undated} without a date`}.
      {back.length > 0 && (
        <>
          {' '}
          <strong>{back.length}</strong> back, not yet in stock
          {held > 0 && (
            <>
              : <strong className="text-held-ink">{held} held</strong>
            </>
          )}
          .
        </>
      )}
    </p>
  );
}
