import { WHY_NOT } from '@/lib/reference/why-not';
import { TEMPER_TRANSITIONS, type TransitionRow } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS, type TemperRow } from '@/lib/trade/tables/tempers';

import { SourcedTable } from './sourced-table';
import { operationWords } from './temper-words';

const MADE_BY: Record<TemperRow['madeBy'], string> = {
  mill: 'mill',
  mill_by_name: 'mill; by a user under another name',
  mill_then_age: 'mill, then aged anywhere',
  user: 'user',
  either: 'either',
};

const FROM: Partial<Record<TransitionRow['from'], string>> = {
  any: 'any',
  any_heat_treated: 'any heat treated',
};

/** Who makes a temper, and what leads from one to the other. */
export function TemperTables() {
  return (
    <>
      <SourcedTable
        table={TEMPER_DESIGNATIONS}
        heads={['Temper', 'Made by', 'By a user it is', 'Without cold work it is']}
        cells={({ temper, madeBy, madeByUserIs, withoutColdWork }) => [
          temper,
          MADE_BY[madeBy],
          madeByUserIs ?? '',
          withoutColdWork ?? '',
        ]}
      />
      <SourcedTable
        table={TEMPER_TRANSITIONS}
        heads={['Alloys', 'From', 'To', 'What is so']}
        cells={({ alloys, from, to, result }) => [
          alloys.join(', '),
          FROM[from] ?? from,
          to,
          resultWords(result),
        ]}
      />
    </>
  );
}

function resultWords(result: TransitionRow['result']): string {
  switch (result.is) {
    case 'made':
      return operationWords(result);
    case 'made_under_other_name':
      return `made, and called ${result.properName}`;
    case 'not_made':
      return `not made: ${WHY_NOT[result.why]}`;
  }
}
