import Link from 'next/link';

import { BatchTag } from '@/components/ui/tag';
import { LateFlag } from '@/components/ui/day';
import { daysBetween, shortDayWords } from '@/lib/day-words';
import { flagWidth, outsideWords, tagTop, type PlacedTag } from '@/lib/tideline/lay-out';
import type { Scale } from '@/lib/tideline/scale';

interface TagLinkProps {
  tag: PlacedTag;
  scale: Scale;
  zone: string;
  today: string;
}

/** One batch on its lane, with everything that belongs to its line. */
export function TagLink({ tag, scale, today }: TagLinkProps) {
  const { batch, late, string } = tag;
  const top = tagTop(tag.row);
  const outside = outsideWords(tag);
  const afterX = late
    ? Math.max(tag.x + tag.width, scale.todayX) + flagWidth(late.days)
    : tag.x + tag.width + 5;
  return (
    <li>
      <div className="absolute" style={{ left: tag.x, top, width: tag.width }}>
        <BatchTag
          stage={batch.stage}
          number={batch.number}
          href={`/batches/${batch.id}`}
          size="tideline"
          show={tag.show}
          text={tag.fading ? 'no date yet' : batch.contents}
          fading={tag.fading}
          daysLate={late?.days}
          sentence={sentenceOf(tag)}
          wide
        />
        <TagMarks tag={tag} />
      </div>
      {late && (
        <span
          aria-hidden="true"
          className="absolute"
          style={{ left: Math.max(tag.x + tag.width, scale.todayX), top: top + 1 }}
        >
          <LateFlag days={late.days} />
        </span>
      )}
      {outside && (
        <span
          aria-hidden="true"
          className={`absolute bg-paper/80 px-1 font-cond text-string leading-6 whitespace-nowrap ${batch.stage === 'held' ? 'text-tag font-semibold text-held-ink' : 'text-quiet'}`}
          style={{ left: afterX, top }}
        >
          {batch.nonconformance && batch.stage === 'held' ? (
            <Link href={`/nonconformances/${batch.nonconformance.id}`} tabIndex={-1}>
              {outside}
            </Link>
          ) : (
            outside
          )}
        </span>
      )}
      {string && (
        <span
          aria-hidden="true"
          className={`absolute font-cond leading-6 whitespace-nowrap ${string.tooLate ? 'text-held-ink' : ''}`}
          style={{ left: string.labelX, top }}
        >
          <span className="text-tag font-semibold">{string.name}</span>{' '}
          <span className={`text-string ${string.tooLate ? '' : 'text-quiet'}`}>
            {string.tooLate
              ? `needed ${string.day}${agoWords(batch.assembly?.neededOn ?? null, today)}`
              : string.day}
          </span>
        </span>
      )}
    </li>
  );
}

function agoWords(neededOn: string | null, today: string): string {
  const days = neededOn === null ? 0 : daysBetween(neededOn, today);
  return days > 0 ? `, ${days} d ago` : '';
}

/** Notches where part of it came back, red ticks where a promise was broken, a torn side where it began before the page. */
function TagMarks({ tag }: { tag: PlacedTag }) {
  if (tag.notches.length === 0 && tag.brokenX.length === 0 && !tag.torn) return null;
  return (
    <svg aria-hidden="true" width={tag.width} height="24" className="pointer-events-none absolute inset-0">
      {tag.notches.map((x) => (
        <path key={x} d={`M${x - 4} 24l4 -7l4 7Z`} fill="var(--paper)" stroke="var(--ink)" />
      ))}
      {tag.brokenX.map((x) => (
        <path key={x} d={`M${x} 1v8`} stroke="var(--held-ink)" strokeWidth="2" />
      ))}
      {tag.torn && <path d="M0 0l4 4l-4 4l4 4l-4 4l4 4l-4 4Z" fill="var(--paper)" />}
    </svg>
  );
}

function sentenceOf({ batch, after }: PlacedTag): string {
  const clock = { zone: 'UTC', now: new Date() };
  const assembly = batch.assembly
    ? `holds up ${batch.assembly.name}${batch.assembly.neededOn ? `, needed ${shortDayWords(batch.assembly.neededOn, clock)}` : ''}`
    : '';
  return [after ?? '', assembly].filter(Boolean).join(', ');
}
