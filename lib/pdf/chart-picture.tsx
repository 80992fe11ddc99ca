import { Path, Rect, Svg, Text, View } from '@react-pdf/renderer';
import type { ReactNode } from 'react';

import type { LineLook } from '@/lib/evidence/chart/line-look';
import { BAND, BAND_INK, GRID, ON_PAPER, WINDOW } from '@/lib/evidence/chart/on-paper';
import type { ChartPaths, PanelPaths } from '@/lib/evidence/chart/paths';

import { type } from './look';
import { circle } from './paper-parts';

/** A chart as it is drawn, and what its numbers mean. */
export interface ChartPicture {
  readonly paths: ChartPaths;
  readonly events: readonly { readonly number: number; readonly says: string }[];
}

/** Families cannot be chained inside a drawing; what stands there is figures and words of ours. */
const FONT = 'Barlow Semi Condensed';
const SIZE = 11;

interface ChartPictureProps {
  picture: ChartPicture;
  width: number;
  /** What stands above the picture, on the same page. */
  children: ReactNode;
}

/** A furnace chart on paper: the band enlarged over the whole run, its lines named beneath, its events by number. */
export function ChartPictureOnPaper({ picture, width, children }: ChartPictureProps) {
  const { paths, events } = picture;
  const { left, right, panels, soak } = paths;
  const [detail, whole] = panels;
  return (
    <>
      <View wrap={false}>
        {children}
        <Svg
          width={width}
          height={(width * paths.height) / paths.width}
          viewBox={`0 0 ${paths.width} ${paths.height}`}
        >
          {soak && (
            <Rect
              x={soak.from}
              y={detail.top}
              width={Math.max(1, soak.to - soak.from)}
              height={whole.bottom - detail.top}
              fill={WINDOW}
            />
          )}
          {panels.map((panel) => (
            <Panel key={panel.top} panel={panel} left={left} right={right} />
          ))}
          {paths.timeTicks.map(({ at }) => (
            <Path key={`t ${at}`} d={`M${at} ${whole.bottom}v5`} stroke={ON_PAPER.ink} strokeWidth={1} />
          ))}
          {paths.timeTicks.map(({ at, says }) => (
            <Word
              key={`w ${at}`}
              x={at}
              y={whole.bottom + 17}
              says={says}
              anchor="middle"
              fill={ON_PAPER.quiet}
            />
          ))}
          {soak && (
            <Path
              d={`M${soak.from} ${detail.top - 12}V${whole.bottom}M${soak.to} ${detail.top - 12}V${whole.bottom}M${soak.from} ${detail.top - 8}H${soak.to}`}
              stroke={ON_PAPER.ink}
              strokeWidth={1}
            />
          )}
          {soak && (
            <Word x={(soak.from + soak.to) / 2} y={detail.top - 15} says={soak.says} anchor="middle" />
          )}
          <Word x={left + 8} y={detail.band.upper - 5} says={paths.bandSays} fill={BAND_INK} />
          {paths.events.map(({ number, x, y }) => (
            <Path key={`c ${number}`} d={circle(x, y, 8)} fill={ON_PAPER.ink} />
          ))}
          {paths.events.map(({ number, x, y }) => (
            <Word key={`n ${number}`} x={x} y={y + 4} says={String(number)} anchor="middle" fill="#FFFFFF" />
          ))}
        </Svg>
        <Legend legend={paths.legend} />
      </View>
      {events.map(({ number, says }) => (
        <Text key={number} style={type.text}>
          {`${number}  ${says}`}
        </Text>
      ))}
    </>
  );
}

function Panel({ panel, left, right }: { panel: PanelPaths; left: number; right: number }) {
  const { top, bottom, ticks, band, lines } = panel;
  return (
    <>
      {ticks.map(({ at }) => (
        <Path key={`g ${at}`} d={`M${left} ${at}H${right}`} stroke={GRID} strokeWidth={1} />
      ))}
      {ticks.map(({ at, says }) => (
        <Word key={`d ${at}`} x={left - 6} y={at + 4} says={says} anchor="end" fill={ON_PAPER.quiet} />
      ))}
      <Rect
        x={left}
        y={band.upper}
        width={right - left}
        height={Math.max(0.5, band.lower - band.upper)}
        fill={BAND}
        fillOpacity={0.7}
      />
      <Path
        d={`M${left} ${band.upper}H${right}M${left} ${band.lower}H${right}`}
        stroke={BAND_INK}
        strokeWidth={1}
      />
      {lines.map(({ name, d, look }) => (
        <Line key={name} d={d} look={look} />
      ))}
      <Path d={`M${left} ${top}V${bottom}H${right}`} stroke={ON_PAPER.ink} strokeWidth={1} />
    </>
  );
}

function Line({ d, look }: { d: string; look: LineLook }) {
  // A line of which nothing is in view has no path, and none may be drawn.
  if (d === '') return null;
  return (
    <Path
      d={d}
      stroke={ON_PAPER[look.ink]}
      strokeWidth={look.width}
      strokeLinejoin="round"
      {...(look.dash.length > 0 && { strokeDasharray: look.dash.join(' ') })}
    />
  );
}

interface WordProps {
  x: number;
  y: number;
  says: string;
  anchor?: 'start' | 'middle' | 'end';
  fill?: string;
}

const Word = ({ x, y, says, anchor = 'start', fill = ON_PAPER.ink }: WordProps) => (
  <Text x={x} y={y} textAnchor={anchor} fill={fill} style={{ fontFamily: FONT, fontSize: SIZE }}>
    {says}
  </Text>
);

function Legend({ legend }: Pick<ChartPaths, 'legend'>) {
  return (
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', paddingVertical: 3 }}>
      {legend.map(({ name, says, look }) => (
        <View key={name} style={{ flexDirection: 'row', width: '33%', paddingRight: 8 }}>
          <Svg width={26} height={9} viewBox="0 0 26 9" style={{ marginRight: 4, marginTop: 1 }}>
            <Line d="M0 4.5H26" look={look} />
          </Svg>
          <Text style={{ ...type.caption, flexGrow: 1, flexBasis: 0 }}>
            <Text style={{ fontWeight: 600 }}>{name}</Text> {says}
          </Text>
        </View>
      ))}
    </View>
  );
}
