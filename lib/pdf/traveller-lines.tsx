import { Text, View } from '@react-pdf/renderer';

import type { TravellerContent } from '@/lib/travellers/content';

import { MONO } from './fonts';
import { INK, LINE, QUIET, RULE, type } from './look';
import { conditionWords } from './paper-words';

const WIDTH = {
  no: 15,
  lot: 40,
  part: 72,
  material: 106,
  thick: 56,
  condition: 54,
  load: 24,
  pieces: 34,
  counted: 44,
};

/** What goes along, line by line, with a box for the count of each hand. */
export function TravellerLines({ lines }: { lines: TravellerContent['lines'] }) {
  const withLoads = lines.some((line) => line.loadNo !== null);
  const total = lines.reduce((sum, line) => sum + line.pieces, 0);
  return (
    <View>
      <View fixed style={{ flexDirection: 'row', borderBottom: `1 solid ${INK}`, paddingBottom: 2 }}>
        <Text style={{ ...type.caption, width: WIDTH.no }} />
        <Text style={{ ...type.caption, width: WIDTH.lot }}>Lot</Text>
        <Text style={{ ...type.caption, width: WIDTH.part }}>Part and revision</Text>
        <Text style={{ ...type.caption, flexGrow: 1, flexBasis: 0 }} />
        <Text style={{ ...type.caption, width: WIDTH.material }}>Material, heat</Text>
        <Text style={{ ...type.caption, width: WIDTH.thick, textAlign: 'right', paddingRight: 8 }}>
          Thickness
        </Text>
        <Text style={{ ...type.caption, width: WIDTH.condition }}>From, to</Text>
        {withLoads && <Text style={{ ...type.caption, width: WIDTH.load, textAlign: 'right' }}>Load</Text>}
        <Text style={{ ...type.caption, width: WIDTH.pieces, textAlign: 'right' }}>Pieces</Text>
        <Text style={{ ...type.caption, width: WIDTH.counted, textAlign: 'right' }}>Counted</Text>
      </View>
      {lines.map((line) => (
        <View
          key={line.lineNo}
          wrap={false}
          style={{ borderBottom: `0.75 solid ${RULE}`, paddingVertical: 3 }}
        >
          <View style={{ flexDirection: 'row', alignItems: 'center' }}>
            <Text style={{ ...type.figure, width: WIDTH.no, color: QUIET }}>{line.lineNo}</Text>
            <Text style={{ ...type.strongFigure, width: WIDTH.lot }}>{line.lotNumber}</Text>
            <Text
              style={{ ...type.strongFigure, width: WIDTH.part }}
            >{`${line.partNumber} ${line.partRevision}`}</Text>
            <Text style={{ ...type.text, flexGrow: 1, flexBasis: 0, paddingRight: 5 }}>{line.partName}</Text>
            <Text style={{ ...type.text, width: WIDTH.material, paddingRight: 4 }}>
              {line.material} <Text style={{ fontFamily: MONO, fontSize: 8, color: QUIET }}>{line.heat}</Text>
            </Text>
            <Text style={{ ...type.figure, width: WIDTH.thick, textAlign: 'right', paddingRight: 8 }}>
              {line.thickness ?? ''}
            </Text>
            <Text style={{ ...type.figure, width: WIDTH.condition }}>{conditionWords(line)}</Text>
            {withLoads && (
              <View style={{ width: WIDTH.load, alignItems: 'flex-end' }}>
                <LoadFrame no={line.loadNo} />
              </View>
            )}
            <Text style={{ ...type.strongFigure, fontSize: 10, width: WIDTH.pieces, textAlign: 'right' }}>
              {line.pieces}
            </Text>
            <CountBox />
          </View>
          {(line.stepNote !== null || line.serials.length > 0) && (
            <Text style={{ ...type.caption, fontSize: 7.8, marginLeft: WIDTH.no, color: QUIET }}>
              {[line.stepNote, line.serials.length > 0 ? `serials ${line.serials.join(', ')}` : null]
                .filter(Boolean)
                .join('. ')}
            </Text>
          )}
        </View>
      ))}
      <View
        wrap={false}
        style={{
          flexDirection: 'row',
          alignItems: 'center',
          borderTop: `1.3 solid ${INK}`,
          paddingVertical: 3,
          marginTop: -0.75,
        }}
      >
        <Text style={{ ...type.strong, marginLeft: WIDTH.no, flexGrow: 1 }}>All pieces</Text>
        <Text style={{ ...type.strongFigure, fontSize: 10, width: WIDTH.pieces, textAlign: 'right' }}>
          {total}
        </Text>
        <CountBox />
      </View>
    </View>
  );
}

/** Single, double, triple frames outlive a bad copier. */
function LoadFrame({ no }: { no: number | null }) {
  if (no === null) return null;
  const number = (
    <Text style={{ ...type.strongFigure, fontSize: 7.6, paddingHorizontal: 3, lineHeight: 1.15 }}>{no}</Text>
  );
  return Array.from({ length: Math.min(no, 3) }).reduce<React.JSX.Element>(
    (inner, _, at) => (
      <View style={{ border: `0.8 solid ${INK}`, padding: at === 0 ? 0 : 0.9 }}>{inner}</View>
    ),
    number,
  );
}

function CountBox() {
  return (
    <View style={{ width: WIDTH.counted, alignItems: 'flex-end' }}>
      <View style={{ width: 34, height: 13, border: `0.8 solid ${LINE}` }} />
    </View>
  );
}
