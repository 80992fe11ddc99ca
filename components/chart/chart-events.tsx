import type { DrawnEvent } from '@/lib/evidence/chart/drawing-of';
import { timeTickWords } from '@/lib/evidence/chart/ticks';
import type { ChartDrawing } from '@/lib/evidence/chart/drawing-of';

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
    <div className="overflow-x-auto pt-3">
      <table className="w-full">
        <caption className="sr-only">Events of the chart</caption>
        <thead>
          <tr className="border-b border-ink text-left font-cond text-caption text-faint">
            {['No.', 'What', 'Thermocouple', 'From', 'To', 'In words'].map((head) => (
              <th key={head} scope="col" className="py-1 pr-4 font-normal">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {events.map(({ number, code, channel, from, to, says }) => (
            <tr
              key={number}
              aria-current={number === chosen || undefined}
              className="border-b border-rule align-top aria-[current]:bg-bench"
            >
              <td className="py-1.5 pr-4">
                <button
                  type="button"
                  className="num min-h-6 min-w-6 underline"
                  aria-label={`Show event ${number}`}
                  onClick={() => onChoose(number)}
                >
                  {number}
                </button>
              </td>
              <td className="py-1.5 pr-4 font-cond text-word">{CODE_WORDS[code]}</td>
              <td className="py-1.5 pr-4">{channel ?? 'all'}</td>
              <td className="num py-1.5 pr-4">{timeTickWords(from, counts)}</td>
              <td className="num py-1.5 pr-4">{timeTickWords(to, counts)}</td>
              <td className="py-1.5 text-row">{says}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
