import Link from 'next/link';

import { readMoment } from '@/components/reference/bench-moment';
import { Cell, Row, Table } from '@/components/ui/table';
import { VerdictWord } from '@/components/ui/verdict';
import type { Verdict } from '@/components/ui/marks';
import type { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import type { ChartRequirement } from '@/lib/evidence/chart/requirement';

const COLUMNS = [{ says: 'Must be proved' }, { says: 'Limit' }, { says: 'Chart' }, { says: 'Verdict' }];

/** What the chart must show beside what it shows, and the sentence that the judgement comes with. */
export function WhatItSays({ judged, requirement }: { judged: JudgedChart; requirement: ChartRequirement }) {
  return (
    <>
      <p className="pb-2 text-row">{judged.why}</p>
      <Table label="What the chart must show" columns={COLUMNS} dense keep>
        {rowsOf(judged, requirement).map(({ what, limit, shows, verdict }) => (
          <Row key={what}>
            <Cell>{what}</Cell>
            <Cell code>{limit}</Cell>
            <Cell code strong>
              {shows}
            </Cell>
            <Cell>
              <VerdictWord verdict={verdict} />
            </Cell>
          </Row>
        ))}
      </Table>
      <QuenchClock judged={judged} requirement={requirement} />
    </>
  );
}

/**
 * Where the chart shows the quench and knows its day, the way to the clock of metal that is not aged yet. It counts from
 * the end of the soak, which lies before the quench: the clock ends too early rather than too late.
 */
function QuenchClock({ judged, requirement }: { judged: JudgedChart; requirement: ChartRequirement }) {
  const { soak_end: end, quench_delay_s: delay } = judged;
  if (requirement.maxQuenchDelayS === undefined || delay === null || end === null) return null;
  if (readMoment(end) === null) return null;
  return (
    <p className="pt-2 text-second">
      If it is not aged yet:{' '}
      <Link href={`/reference/holding?quenched=${end.slice(0, 16)}`}>as-quenched clock from this quench</Link>
    </p>
  );
}

interface Shown {
  what: string;
  limit: string;
  shows: string;
  verdict: Verdict;
}

function rowsOf(judged: JudgedChart, asked: ChartRequirement): Shown[] {
  const { soak_minutes: soak, max_overshoot_above_upper_limit: over, quench_delay_s: delay } = judged;
  const counted = judged.understood.channels.filter(({ role, excluded }) => role === 'load' && !excluded);
  const [lower, upper] = [asked.set - asked.tolerance, asked.set + asked.tolerance];
  return [
    ...(asked.soakMinutes === undefined
      ? []
      : [
          {
            what: 'Soak',
            limit: [`${asked.soakMinutes} min`, asked.soakMinutesMax && `to ${asked.soakMinutesMax}`]
              .filter(Boolean)
              .join(' '),
            shows: soak === null ? 'none' : `${soak.toFixed(1)} min`,
            verdict: within(soak, asked.soakMinutes, asked.soakMinutesMax),
          },
        ]),
    {
      what: 'Band',
      limit: `${lower} to ${upper} °${asked.unit}`,
      shows: judged.max_temperature === null ? '' : `to ${judged.max_temperature.toFixed(1)}`,
      verdict: within(over, undefined, asked.maxOvershoot ?? 0),
    },
    ...(asked.maxQuenchDelayS === undefined
      ? []
      : [
          {
            what: 'Quench delay',
            limit: `${asked.maxQuenchDelayS} s`,
            shows: delay === null ? 'cannot be seen' : `${delay.toFixed(0)} s`,
            verdict: within(delay, undefined, asked.maxQuenchDelayS),
          },
        ]),
    {
      what: 'Couples',
      limit: '',
      shows: `${counted.length} counted`,
      verdict: counted.length > 0 ? 'meets' : 'cannot_tell',
    },
  ];
}

function within(value: number | null, least: number | undefined, most: number | undefined): Verdict {
  if (value === null) return 'cannot_tell';
  return value >= (least ?? -Infinity) && value <= (most ?? Infinity) ? 'meets' : 'does_not_meet';
}
