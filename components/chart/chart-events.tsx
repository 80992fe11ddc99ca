import { Cell, Row, Table } from '@/components/ui/table';
import type { ChartDrawing, DrawnEvent } from '@/lib/evidence/chart/drawing-of';
import { timeTickWords } from '@/lib/evidence/chart/ticks';

const CODE_WORDS: Record<DrawnEvent['code'], string> = {
  gap: 'Gap',
  open_circuit: 'Open circuit',
  flat_line: 'Flat line',
  overshoot: 'Above the band',
  short_soak: 'Short soak',
  late_channel: 'Late',
  spike: 'Jump',
  quench: 'Quench',
};

const COLUMNS = [
  { says: 'No.' },
  { says: 'What' },
  { says: 'Thermocouple' },
  { says: 'From' },
  { says: 'To' },
  { says: 'In words' },
];

interface ChartEventsProps {
  events: readonly DrawnEvent[];
  counts: ChartDrawing['counts'];
  chosen: number | null;
  onChoose: (number: number) => void;
}

/** What happened, under the numbers that stand in the picture; choosing one brings the cursor to it. */
export function ChartEvents({ events, counts, chosen, onChoose }: ChartEventsProps) {
  if (events.length === 0)
    return <p className="pt-3 text-second text-quiet">Nothing happened that needs a word.</p>;
  return (
    <Table label="Events of the chart" columns={COLUMNS} dense className="pt-3">
      {events.map(({ number, code, channel, from, to, says }) => (
        <Row key={number} selected={number === chosen}>
          <Cell>
            <button
              type="button"
              className="num min-h-6 min-w-6 underline"
              aria-label={`Show event ${number}`}
              onClick={() => onChoose(number)}
            >
              {number}
            </button>
          </Cell>
          <Cell strong>{CODE_WORDS[code]}</Cell>
          <Cell head="Thermocouple">{channel ?? 'all'}</Cell>
          <Cell code head="From">
            {timeTickWords(from, counts)}
          </Cell>
          <Cell code head="To">
            {timeTickWords(to, counts)}
          </Cell>
          <Cell>{says}</Cell>
        </Row>
      ))}
    </Table>
  );
}
