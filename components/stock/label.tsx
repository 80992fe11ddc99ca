import { StageMark } from '@/components/ui/marks';
import { type Clock, shortDayWords } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';
import type { Release } from '@/lib/stock/contract';

export interface LabelCode {
  /** The dark squares as one path, and how many squares it is wide. */
  path: string;
  width: number;
}

interface LabelProps {
  release: Release;
  shop: string;
  code: LabelCode;
  clock: Clock;
}

/** A label of 100 × 60 mm for a bag or bin: which pieces, in which condition, where, and a code that leads to their evidence. */
export function Label({ release, shop, code, clock }: LabelProps) {
  const stands = release.location === null ? 'released' : 'stocked';
  return (
    <article className="lw-label" aria-label={`Label of ${release.lotNumber}, ${release.pieces} pieces`}>
      <Outline />
      <div className="lw-label-body">
        <div className="lw-label-top">
          <div className="min-w-0">
            <div className={`lw-label-number ${release.lotNumber.length > 12 ? 'lw-label-long' : ''}`}>
              {release.lotNumber}
            </div>
            <div className="lw-label-shop">
              {stands}, {shop}
            </div>
          </div>
          <Code {...code} says={`Code with the address of lot ${release.lotNumber}`} />
        </div>
        <div className="lw-label-part">
          <div className="min-w-0">
            <div className="lw-label-part-number">
              {release.partNumber}
              <span> rev </span>
              {release.partRevision}
            </div>
            <div className="lw-label-name">{release.partName}</div>
          </div>
          <div className="lw-label-pieces">
            <b>{release.pieces}</b>
            <span>{release.pieces === 1 ? 'piece' : 'pieces'}</span>
          </div>
        </div>
        <dl className="lw-label-cells">
          <Fact caption="Material" says={release.material} />
          <Fact caption="Condition" says={release.condition} />
          <Fact caption="Heat" says={release.heat} />
          {release.location === null ? (
            <Fact
              caption="Goes on to"
              says={release.nextProcess ? PROCESS_WORDS[release.nextProcess] : 'the next step'}
            />
          ) : (
            <Fact caption="Place" says={release.location} />
          )}
        </dl>
        <p className="lw-label-foot">{footWords(release, clock)}</p>
      </div>
    </article>
  );
}

/** The tag as it hangs on a part, with the ring to punch. No line is under 0.25 mm, two dots of a 203 dpi head. */
function Outline() {
  return (
    <>
      <svg viewBox="0 0 100 60" aria-hidden="true" className="lw-label-outline">
        <path d="M6.4 1H99V59H6.4L1 53.6V6.4Z" fill="#fff" stroke="#000" strokeWidth="0.5" />
        <path d="M6.4 1H16V59H6.4L1 53.6V6.4Z" className="lw-label-edge" stroke="#000" strokeWidth="0.5" />
        <circle cx="8.5" cy="30" r="4" fill="#fff" stroke="#000" strokeWidth="0.375" />
        <circle
          cx="8.5"
          cy="30"
          r="2.5"
          fill="none"
          stroke="#000"
          strokeWidth="0.25"
          strokeDasharray="0.5 0.5"
        />
      </svg>
      <span className="lw-label-mark">
        <StageMark stage="stocked" size={16} />
      </span>
    </>
  );
}

/** Half a millimetre a square: four dots of the print head, so that no edge falls between two. */
function Code({ path, width, says }: LabelCode & { says: string }) {
  const side = `calc(var(--mm) * ${width / 2})`;
  return (
    <svg
      viewBox={`0 0 ${width} ${width}`}
      role="img"
      aria-label={says}
      shapeRendering="crispEdges"
      style={{ width: side, height: side }}
      className="flex-none"
    >
      <path d={path} fill="#000" />
    </svg>
  );
}

function Fact({ caption, says }: { caption: string; says: string }) {
  return (
    <div className="min-w-0">
      <dt>{caption}</dt>
      <dd>{says}</dd>
    </div>
  );
}

/** `proved 20 Apr 2026, cert. 26-04177-1, batch B-0404`. A label outlives the year. */
function footWords(release: Release, clock: Clock): string {
  const { provedOn, certificates, batchNumber, serials } = release;
  const parts = [
    serials.length > 0 ? serialWords(serials) : null,
    provedOn === null ? null : `proved ${withYear(provedOn, clock)}`,
    certificates.length > 0
      ? `cert. ${certificates.slice(0, 2).join(', ')}${certificates.length > 2 ? ` and ${certificates.length - 2} more` : ''}`
      : null,
    `batch ${batchNumber}`,
  ];
  return parts.filter(Boolean).join(', ');
}

const MOST_SERIALS = 6;
const serialWords = (serials: readonly string[]) =>
  `${serials.slice(0, MOST_SERIALS).join(' ')}${serials.length > MOST_SERIALS ? ` and ${serials.length - MOST_SERIALS} more` : ''}`;

function withYear(day: string, clock: Clock): string {
  const words = shortDayWords(day, clock);
  return /\d{4}$/.test(words) ? words : `${words} ${dayYear(day)}`;
}
const dayYear = (day: string) => day.slice(0, 4);
