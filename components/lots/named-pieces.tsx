import { Section } from '@/components/ui/section';
import type { Lot } from '@/lib/lots/contract';
import { PLACES } from '@/lib/stock/places';
import { spotWords } from './place-words';

/** The serials of a lot, by where they are. */
export function NamedPieces({ lot }: { lot: Lot }) {
  const groups = new Map<string, { order: number; serials: string[] }>();
  for (const { serial, place, holder } of lot.named) {
    if (place === null) continue;
    const words = spotWords({ place, holder });
    const group = groups.get(words) ?? { order: PLACES.indexOf(place), serials: [] };
    group.serials.push(serial);
    groups.set(words, group);
  }
  return (
    <Section title="Named pieces" note={`${lot.named.length.toLocaleString('en-US')} serials`}>
      <dl>
        {[...groups]
          .sort(([, a], [, b]) => a.order - b.order)
          .map(([words, { serials }]) => (
            <div
              key={words}
              className="grid grid-cols-[minmax(9rem,17rem)_minmax(0,1fr)] gap-x-4 border-b border-rule py-2 max-sm:grid-cols-1"
            >
              <dt className="font-cond text-word">{words}</dt>
              <dd className="flex flex-wrap gap-x-4 gap-y-0.5">
                {serials.map((serial) => (
                  <span key={serial} className="num">
                    {serial}
                  </span>
                ))}
              </dd>
            </div>
          ))}
      </dl>
    </Section>
  );
}
