import { Numbers } from '@/components/plots/numbers';
import { Plot } from '@/components/plots/plot';
import { ticksOf } from '@/components/plots/scale';
import {
  LOT_TOLERANCE_POINT,
  operatingCharacteristic,
  PRODUCER_POINT,
  qualityAt,
  type AcceptancePlan,
} from '@/lib/trade/sampling/operating-characteristic';

import { percentWords, sampleRefusal } from './sample-words';
import { NoAnswer } from './answer';
import { SourceLine } from './source-line';

const POINTS = 120;

/** How often lots of each quality pass, with the producer's point and the lot tolerance marked. */
export function SampleCurve({ plan, lotSize }: { plan: AcceptancePlan; lotSize: number }) {
  const producer = qualityAt(plan, PRODUCER_POINT);
  const tolerance = qualityAt(plan, LOT_TOLERANCE_POINT);
  if (!producer.ok) return <NoAnswer says={sampleRefusal(producer.reason)} />;
  if (!tolerance.ok) return <NoAnswer says={sampleRefusal(tolerance.reason)} />;
  const last = Math.min(100, Math.ceil(tolerance.nonconformingPct * 1.6));
  const curve = operatingCharacteristic(
    plan,
    Array.from({ length: POINTS + 1 }, (_, at) => (last * at) / POINTS),
  );
  if (!curve.ok) return null;
  const drop = (pct: number, share: number) =>
    [
      [0, share * 100],
      [pct, share * 100],
      [pct, 0],
    ] as const;
  return (
    <>
      <Plot
        says="Chance that a lot passes, by how much of it is bad"
        height={260}
        x={{ from: 0, to: last, ticks: ticksOf(0, last, 6), says: 'bad in the lot, %' }}
        y={{ from: 0, to: 104, ticks: ticksOf(0, 100, 5), says: 'passes, %' }}
        series={[
          {
            says: 'lots that pass, %',
            points: curve.points.map(({ nonconformingPct, accepted }) => [nonconformingPct, 100 * accepted]),
            look: 'main',
          },
          {
            says: `95 % pass at ${percentWords(producer.nonconformingPct)}`,
            points: drop(producer.nonconformingPct, PRODUCER_POINT),
            look: 'second',
            nameAt: { x: last, y: 92, anchor: 'end' },
          },
          {
            says: `10 % pass at ${percentWords(tolerance.nonconformingPct)}`,
            points: drop(tolerance.nonconformingPct, LOT_TOLERANCE_POINT),
            look: 'limit',
            nameAt: { x: last, y: 15, anchor: 'end' },
          },
        ]}
      />
      <p className="text-second">
        The processor can rely on lots with {percentWords(producer.nonconformingPct)} bad (producer’s point);
        you are guarded from {percentWords(tolerance.nonconformingPct)} bad (lot tolerance). Reckoned for a
        steady stream of lots; {lotSize} pieces are one of them.
      </p>
      <SourceLine source={curve.source} />
      <Numbers
        label="The curve as a table"
        heads={['Bad, %', 'Passes, %']}
        rows={curve.points
          .filter((_, at) => at % 10 === 0)
          .map(({ nonconformingPct, accepted }) => [
            nonconformingPct.toFixed(2),
            (100 * accepted).toFixed(1),
          ])}
      />
    </>
  );
}
