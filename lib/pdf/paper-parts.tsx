import { Page, Path, Svg, Text, View, type PageProps } from '@react-pdf/renderer';
import type { ReactNode } from 'react';

import { COND, MONO, SANS } from './fonts';
import { FAINT, INK, LINE, MARGIN, QUIET, RULE, type } from './look';

type Sheet = 'letter' | 'a4';

const SIZES = {
  letter: { size: 'LETTER', width: 612 },
  a4: { size: 'A4', width: 595.28 },
} as const satisfies Record<Sheet, { size: PageProps['size']; width: number }>;

/** Width between the margins, in points. */
export const contentWidth = (sheet: Sheet): number => SIZES[sheet].width - 2 * MARGIN;

interface PaperProps {
  sheet: Sheet;
  /** Left in the foot of each page: what this is, when it was stated and by whom. */
  stated: string;
  /** SHA-256 of all that the paper says, in the foot. */
  hash: string;
  children: ReactNode;
}

/** A sheet with margins, and a foot that names the paper and its page. */
export function Paper({ sheet, stated, hash, children }: PaperProps) {
  // No line height here: what inherits one loses the text it renders per page.
  return (
    <Page
      size={SIZES[sheet].size}
      style={{
        paddingTop: MARGIN - 6,
        paddingHorizontal: MARGIN,
        paddingBottom: MARGIN + 18,
        fontFamily: SANS,
        fontSize: 8.6,
        color: INK,
      }}
    >
      {children}
      <View
        fixed
        style={{
          position: 'absolute',
          left: MARGIN,
          right: MARGIN,
          bottom: MARGIN - 12,
          borderTop: `1 solid ${INK}`,
          paddingTop: 4,
          flexDirection: 'row',
          justifyContent: 'space-between',
        }}
      >
        <Text
          style={{ fontFamily: COND, fontSize: 7.6, color: QUIET }}
          render={({ pageNumber, totalPages }) => `${stated} Page ${pageNumber} of ${totalPages}.`}
        />
        <Text
          style={{ fontFamily: MONO, fontSize: 7, color: QUIET }}
        >{`sha-256 ${hash.slice(0, 4)} ${hash.slice(4, 8)} … ${hash.slice(-4)}`}</Text>
      </View>
    </Page>
  );
}

/** The tag across the top: cut corners, an eye with the place to punch, and what is hung on it. */
export function TagHead({
  width,
  height = 84,
  eye,
  children,
}: {
  width: number;
  height?: number;
  eye: string;
  children: ReactNode;
}) {
  const [cut, ring] = [19, 56];
  const outline = `M${cut} 1H${width - 1}V${height - 1}H${cut}L1 ${height - cut}V${cut}Z`;
  const middle = height / 2;
  return (
    <View style={{ width, height }}>
      <Svg
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        style={{ position: 'absolute', top: 0, left: 0 }}
      >
        <Path d={outline} fill="#FFFFFF" stroke={INK} strokeWidth={1.5} />
        <Path
          d={`M${cut} 1H${ring}V${height - 1}H${cut}L1 ${height - cut}V${cut}Z`}
          fill={eye}
          stroke={INK}
          strokeWidth={1.5}
        />
        <Path d={circle(30, middle, 13)} fill="#FFFFFF" stroke={INK} strokeWidth={1.1} />
        <Path
          d={circle(30, middle, 7)}
          fill="#FFFFFF"
          stroke={INK}
          strokeWidth={0.75}
          strokeDasharray="1.5 1.5"
        />
        <Path d={`M30 ${middle - 4}v8M26 ${middle}h8`} stroke={INK} strokeWidth={0.75} fill="none" />
      </Svg>
      <View
        style={{
          position: 'absolute',
          left: ring + 13,
          right: 11,
          top: 8,
          bottom: 6,
          justifyContent: 'space-between',
        }}
      >
        {children}
      </View>
    </View>
  );
}

/** A full circle as the path of a drawing. */
export const circle = (x: number, y: number, r: number): string =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`;

export interface Cell {
  caption: string;
  says: string;
  rest?: string;
  mono?: boolean;
  /** Its share of the width; 1 where nothing is said. */
  grow?: number;
}

/** A row of captioned cells, as the title block of a drawing. */
export function Cells({ cells }: { cells: readonly Cell[] }) {
  return (
    <View style={{ flexDirection: 'row', border: `1 solid ${INK}`, marginTop: 8 }}>
      {cells.map(({ caption, says, rest, mono, grow = 1 }, at) => (
        <View
          key={caption}
          style={{
            flexGrow: grow,
            flexBasis: 0,
            paddingHorizontal: 6,
            paddingVertical: 3,
            ...(at === 0 ? {} : { borderLeft: `1 solid ${RULE}` }),
          }}
        >
          <Text style={type.caption}>{caption}</Text>
          <Text style={{ ...(mono ? type.strongFigure : type.strong), fontSize: 9.4 }}>{says}</Text>
          {rest ? <Text style={type.text}>{rest}</Text> : null}
        </View>
      ))}
    </View>
  );
}

/** Opens a section with a heavy line. */
export function Heading({ title, note, ruled = true }: { title: string; note?: string; ruled?: boolean }) {
  return (
    <View
      style={{
        flexDirection: 'row',
        justifyContent: 'space-between',
        alignItems: 'flex-end',
        paddingTop: 3,
        paddingBottom: 3,
        ...(ruled ? { borderTop: `1.3 solid ${INK}` } : {}),
      }}
      minPresenceAhead={40}
    >
      <Text style={{ ...type.section, flexShrink: 1 }}>{title}</Text>
      {note ? <Text style={type.quiet}>{note}</Text> : null}
    </View>
  );
}

/** A name and what is asked of it. */
export function Asked({
  name,
  says,
  rest,
  width = 96,
}: {
  name: string;
  says: string;
  rest?: string;
  width?: number;
}) {
  return (
    <View
      wrap={false}
      style={{ flexDirection: 'row', borderBottom: `0.75 solid ${RULE}`, paddingVertical: 2.4 }}
    >
      <Text style={{ ...type.text, width, paddingRight: 6 }}>{name}</Text>
      <View style={{ flexGrow: 1, flexBasis: 0 }}>
        {says ? <Text style={type.strongFigure}>{says}</Text> : null}
        {rest ? <Text style={{ ...type.caption, fontSize: 7.6 }}>{rest}</Text> : null}
      </View>
    </View>
  );
}

export function Bulleted({ says }: { says: string }) {
  return (
    <View
      wrap={false}
      style={{ flexDirection: 'row', borderBottom: `0.75 solid ${RULE}`, paddingVertical: 2.6 }}
    >
      <Svg width={6} height={6} viewBox="0 0 6 6" style={{ marginTop: 2.6, marginRight: 5 }}>
        <Path d="M3 0L6 3L3 6L0 3Z" fill={INK} />
      </Svg>
      <Text style={{ ...type.text, flexGrow: 1, flexBasis: 0 }}>{says}</Text>
    </View>
  );
}

/** A field to sign in, with what is to be written under its line. */
export function Hand({ title, under, first }: { title: string; under: string; first: boolean }) {
  return (
    <View
      style={{
        flexGrow: 1,
        flexBasis: 0,
        height: 56,
        paddingHorizontal: 5,
        paddingTop: 3,
        paddingBottom: 4,
        justifyContent: 'space-between',
        ...(first ? {} : { borderLeft: `1 solid ${INK}` }),
      }}
    >
      <Text style={type.label}>{title}</Text>
      <Text style={{ ...type.caption, borderTop: `0.75 solid ${LINE}`, paddingTop: 2, color: FAINT }}>
        {under}
      </Text>
    </View>
  );
}
