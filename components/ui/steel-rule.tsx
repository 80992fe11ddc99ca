import { inRem } from './marks';

export interface RuleMark {
  at: number;
  tone?: 'ink' | 'held' | 'proved' | undefined;
  /** A word over the mark: "minimum 180.00". */
  says?: string | undefined;
}

interface SteelRuleProps {
  from?: number;
  to: number;
  /** A tick for each of these. */
  tick: number;
  /** A long tick with its number for each of these. */
  number: number;
  /** The bar: how far it has come. */
  value?: number | undefined;
  tone?: 'ink' | 'proved' | 'held' | 'stocked';
  /** The limit, a line across. */
  limit?: RuleMark | undefined;
  /** The span between value and limit that is still free, in straw. */
  room?: boolean;
  band?: { from: number; to: number } | undefined;
  marks?: readonly RuleMark[];
  /** One sentence for those who cannot see it: "9 min of 15 min". */
  says: string;
  width?: number;
  /** Thin, without numbers: a row of a table. */
  small?: boolean;
}

const COLOURS = {
  ink: 'var(--ink)',
  proved: 'var(--proved)',
  held: 'var(--held-ink)',
  stocked: 'var(--stocked-ink)',
};

/** A quantity with a limit, drawn so that the number can be read off it. Narrower than asked, only its length shrinks. */
export function SteelRule(props: SteelRuleProps) {
  const { from = 0, to, tick, number, value, limit, room, band, marks = [], says } = props;
  const { width = 190, small = false, tone = small ? 'stocked' : 'ink' } = props;
  const words = [...marks, ...(limit ? [limit] : [])].some((mark) => mark.says);
  const top = words ? 16 : 0;
  const line = top + (small ? 9 : 20);
  const bar = small ? 6 : 9;
  const share = (at: number) => round(((Math.min(Math.max(at, from), to) - from) / (to - from)) * 100);
  const place = (at: number) => `${share(at)}%`;
  const span = (start: number, end: number) => `${round(share(end) - share(start))}%`;

  return (
    <svg
      width={inRem(width)}
      height={inRem(line + (small ? 2 : 17))}
      role="img"
      aria-label={says}
      className="max-w-full overflow-visible"
    >
      {band && (
        <rect
          x={place(band.from)}
          y={top + 2}
          width={span(band.from, band.to)}
          height={line - top - 2}
          fill="var(--proved-wash)"
        />
      )}
      {value !== undefined && (
        <rect x="0" y={line - bar} width={place(value)} height={bar} fill={COLOURS[tone]} />
      )}
      {room && value !== undefined && limit && limit.at > value && (
        <rect
          x={place(value)}
          y={line - bar}
          width={span(value, limit.at)}
          height={bar}
          fill="var(--dispatched-wash)"
          stroke="var(--dispatched-ink)"
        />
      )}
      <Ticks from={from} to={to} tick={tick} number={number} place={place} line={line} small={small} />
      <line x1="0" x2="100%" y1={line} y2={line} stroke="var(--line)" />
      {[...marks, ...(limit ? [limit] : [])].map((mark) => (
        <Mark
          key={`${mark.at} ${mark.says ?? ''}`}
          mark={mark}
          share={share(mark.at)}
          top={top}
          line={line}
        />
      ))}
    </svg>
  );
}

interface TicksProps extends Required<Pick<SteelRuleProps, 'from' | 'to' | 'tick' | 'number' | 'small'>> {
  place: (at: number) => string;
  line: number;
}

function Ticks({ from, to, tick, number, place, line, small }: TicksProps) {
  const count = Math.floor((to - from) / tick + 1e-9);
  const steps = Array.from({ length: count + 1 }, (_, index) => round(from + index * tick));
  const anchor = (at: number) => {
    if (at === from) return 'start';
    return at === to ? 'end' : 'middle';
  };
  return (
    <>
      {steps.map((at) => {
        const long = isMultiple(at, number);
        // On a row the ticks rise from the line, because below it there is no room for them.
        const reach = small ? -(long ? 8 : 4) : long ? 6 : 3; // eslint-disable-line no-nested-ternary -- two by two cases
        return (
          <g key={at}>
            <line x1={place(at)} x2={place(at)} y1={line} y2={line + reach} stroke="var(--line)" />
            {long && !small && (
              <text x={place(at)} y={line + 15} fontSize="11" textAnchor={anchor(at)} className="fill-faint">
                {at.toLocaleString('en-US')}
              </text>
            )}
          </g>
        );
      })}
    </>
  );
}

interface MarkProps {
  mark: RuleMark;
  /** How far along the rule, in hundredths. */
  share: number;
  top: number;
  line: number;
}

function Mark({ mark: { tone = 'ink', says }, share, top, line }: MarkProps) {
  const colour = tone === 'proved' ? 'var(--proved-ink)' : COLOURS[tone];
  const left = share > 60;
  return (
    <g>
      <line x1={`${share}%`} x2={`${share}%`} y1={top} y2={line + 3} stroke={colour} strokeWidth="2" />
      {says && (
        <text
          x={`${share}%`}
          dx={left ? 1 : -1}
          y="11"
          textAnchor={left ? 'end' : 'start'}
          className="font-cond"
          fontSize="13.5"
          style={{ fill: colour }}
        >
          {says}
        </text>
      )}
    </g>
  );
}

const round = (value: number) => Math.round(value * 1e4) / 1e4;
const isMultiple = (value: number, of: number) => Math.abs(value / of - Math.round(value / of)) < 1e-6;
