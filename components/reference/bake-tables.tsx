import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import type { EmbrittlementRow } from '@/lib/trade/tables/embrittlement-row';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';

import { PART_KINDS } from './bake-words';
import { SourcedTable } from './sourced-table';

const TREATMENTS: Record<EmbrittlementRow['treatment'], string> = {
  embrittlement_relief: 'bake',
  stress_relief: 'stress relief before',
  not_to_be_plated: 'not plated',
  special_cleaning: 'special cleaning',
};

/** Rules of the plating documents, and hours by strength, as printed. */
export function BakeTables() {
  return (
    <>
      <SourcedTable
        table={EMBRITTLEMENT_RULES}
        heads={['Specification', 'Revision', 'What', 'Parts', 'From', 'Temperature', 'Hours', 'Start, h']}
        cells={(row) => [
          row.specifications.join(', '),
          revisionWords(row.revisions),
          TREATMENTS[row.treatment],
          row.kinds?.map((kind) => PART_KINDS[kind]).join(', ') ?? '',
          thresholdWords(row.from),
          row.temperature ? `${row.temperature.range.join(' to ')} °${row.temperature.unit}` : '',
          hoursWords(row),
          row.startWithinHours ?? '',
        ]}
      />
      <SourcedTable
        table={BAKE_HOURS_BY_STRENGTH}
        heads={['MPa', 'HRC', 'Hours at least']}
        cells={({ mpa, hrc, hours }) => [mpa.join(' to '), hrc.join(' to '), hours]}
      />
    </>
  );
}

function revisionWords(revisions: EmbrittlementRow['revisions']): string {
  if (revisions === 'any') return 'any';
  if ('letters' in revisions) return revisions.letters.join(', ');
  const { fromYear, toYear } = revisions;
  return [fromYear && `from ${fromYear}`, toYear && `to ${toYear}`].filter(Boolean).join(' ');
}

const thresholdWords = (from: EmbrittlementRow['from']): string =>
  from
    ? `${from.isOver ? 'over ' : ''}${[
        from.hrc === undefined ? '' : `HRC ${from.hrc}`,
        from.ksi === undefined ? '' : `${from.ksi} ksi`,
        from.mpa === undefined ? '' : `${from.mpa} MPa`,
      ]
        .filter(Boolean)
        .join(' or ')}`
    : '';

function hoursWords({ hours, isHoursAgreed }: EmbrittlementRow): string {
  if (hours === 'by_strength') return 'by strength';
  if (isHoursAgreed) return 'agreed';
  return hours ? [...new Set(hours)].join(' to ') : '';
}
