import { PH_STEEL_CONDITIONS } from '@/lib/trade/tables/ph-steel-conditions';
import { STEEL_TEMPERING } from '@/lib/trade/tables/steel-tempering';
import { STEEL_WINDOWS } from '@/lib/trade/tables/steel-windows';

import { SourcedTable } from './sourced-table';
import { OPERATIONS } from './steel-words';

const span = (range: readonly number[]): string => [...new Set(range)].join(' to ');

/** Windows, tempering and ageing conditions as printed. */
export function SteelTables() {
  return (
    <>
      <SourcedTable
        table={STEEL_TEMPERING}
        heads={['Steel', 'ksi', 'Temper, °F', 'Times']}
        cells={({ steel, ksi, temperF, times }) => [steel, span(ksi), span(temperF), times]}
      />
      <SourcedTable
        table={STEEL_WINDOWS}
        heads={['Steel', 'What', '°F']}
        cells={({ steel, operation, rangeF }) => [steel, OPERATIONS[operation], span(rangeF)]}
      />
      <SourcedTable
        table={PH_STEEL_CONDITIONS}
        heads={['Steels', 'Condition', '°F', 'Hours', 'ksi at least', 'HRC']}
        cells={({ steels, condition, ageF, hours, tensileKsiMin, hrc }) => [
          steels.join(', '),
          condition,
          ageF,
          hours,
          tensileKsiMin,
          span(hrc),
        ]}
      />
    </>
  );
}
