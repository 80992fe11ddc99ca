import { Text, View } from '@react-pdf/renderer';

import { againstWords, chartWords } from '@/lib/dossiers/chart-words';
import type { DossierBatch, DossierChart } from '@/lib/dossiers/content';
import { fieldWords } from '@/lib/readings/field-words';

import { ChartPictureOnPaper, type ChartPicture } from './chart-picture';
import { INK, RULE, type } from './look';

interface DossierChartsProps {
  charts: readonly DossierChart[];
  /** By the chart's id. */
  pictures: ReadonlyMap<string, ChartPicture>;
  width: number;
}

/** The furnace charts of a batch as the machine read them, each with its picture. */
export function DossierCharts({ charts, pictures, width }: DossierChartsProps) {
  return charts.map((chart) => {
    const picture = pictures.get(chart.id);
    const head = (
      <>
        <Text style={type.strong}>{chartWords(chart)}</Text>
        <Text style={type.quiet}>{`${againstWords(chart)} ${chart.why}`}</Text>
      </>
    );
    return (
      <View key={chart.id} style={{ borderBottom: `0.75 solid ${RULE}`, paddingTop: 4, paddingBottom: 5 }}>
        {picture ? (
          <ChartPictureOnPaper picture={picture} width={width}>
            {head}
          </ChartPictureOnPaper>
        ) : (
          head
        )}
      </View>
    );
  });
}

const WIDTH = { certificate: 84, field: 112, read: 96, corrected: 96 };

/** What the machine read on the batch's certificates, and what a person put in its place. Nothing where nobody did. */
export function DossierCorrections({
  corrections,
  moment,
}: Pick<DossierBatch, 'corrections'> & { moment: (at: string) => string }) {
  if (corrections.length === 0) return null;
  return (
    <View style={{ paddingTop: 4 }}>
      <Text style={type.label}>Read by machine, corrected by a person</Text>
      <Line
        cells={['Certificate', 'What', 'As read', 'As corrected', 'By']}
        style={type.caption}
        rule={`0.75 solid ${INK}`}
      />
      {corrections.map((one, at) => (
        <Line
          key={at}
          cells={[
            one.certificate,
            fieldWords(one.field),
            one.read ?? 'nothing',
            one.corrected || 'not stated',
            `${one.by}, ${moment(one.at)}`,
          ]}
          style={type.text}
          rule={`0.75 solid ${RULE}`}
        />
      ))}
    </View>
  );
}

interface LineProps {
  cells: readonly [certificate: string, field: string, read: string, corrected: string, by: string];
  style: (typeof type)['text'];
  rule: string;
}

function Line({ cells: [certificate, field, read, corrected, by], style, rule }: LineProps) {
  return (
    <View wrap={false} style={{ flexDirection: 'row', borderBottom: rule, paddingVertical: 2 }}>
      <Text style={{ ...style, width: WIDTH.certificate, paddingRight: 6 }}>{certificate}</Text>
      <Text style={{ ...style, width: WIDTH.field, paddingRight: 6 }}>{field}</Text>
      <Text style={{ ...style, width: WIDTH.read, paddingRight: 6 }}>{read}</Text>
      <Text style={{ ...style, width: WIDTH.corrected, paddingRight: 6 }}>{corrected}</Text>
      <Text style={{ ...style, flexGrow: 1, flexBasis: 0 }}>{by}</Text>
    </View>
  );
}
