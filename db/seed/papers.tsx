import { Document, Page, Path, StyleSheet, Svg, Text, View } from '@react-pdf/renderer';

import { renderPdf } from '@/lib/pdf/render-pdf';

/** What the processors' and mills' own forms say. Everything on them is invented. */
interface FormLine {
  cells: readonly string[];
}

interface Form {
  title: string;
  from: { name: string; address: string };
  facts: readonly (readonly [name: string, value: string])[];
  columns: readonly string[];
  lines: readonly FormLine[];
  statements: readonly string[];
  signed: { name: string; role: string; day: string } | null;
  at: Date;
}

const style = StyleSheet.create({
  page: { padding: 48, fontSize: 9.5, lineHeight: 1.35 },
  title: { fontFamily: 'Barlow Semi Condensed', fontWeight: 600, fontSize: 16, textAlign: 'right' },
  house: { fontFamily: 'Barlow', fontWeight: 600, fontSize: 15, lineHeight: 1.5 },
  fact: { flexDirection: 'row', width: '50%', paddingVertical: 2 },
  cell: { flexGrow: 1, flexBasis: 0, padding: 3 },
});

/** A form of one page, as a processor prints it: its head, what it is for, a table, what it states, a signature. */
export function makeForm(form: Form): Promise<Buffer> {
  return renderPdf(
    <Document
      title={form.title}
      author={form.from.name}
      creationDate={form.at}
      producer={form.from.name}
      creator={form.from.name}
    >
      <Page size="LETTER" style={{ ...style.page, fontFamily: 'Barlow' }}>
        <View
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            borderBottom: '1.5 solid #000',
            paddingBottom: 8,
          }}
        >
          <View>
            <Text style={style.house}>{form.from.name}</Text>
            <Text>{form.from.address}</Text>
          </View>
          <Text style={style.title}>{form.title}</Text>
        </View>
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', paddingVertical: 10 }}>
          {form.facts.map(([name, value]) => (
            <View key={name} style={style.fact}>
              <Text style={{ width: 96, color: '#555' }}>{name}</Text>
              <Text style={{ fontFamily: 'Spline Sans Mono' }}>{value}</Text>
            </View>
          ))}
        </View>
        <View style={{ border: '1 solid #000' }}>
          <Row cells={form.columns} head />
          {form.lines.map((line, at) => (
            <Row key={at} cells={line.cells} />
          ))}
        </View>
        {form.statements.map((statement) => (
          <Text key={statement} style={{ marginTop: 10 }}>
            {statement}
          </Text>
        ))}
        {form.signed && (
          <View style={{ marginTop: 14, width: 220 }}>
            <Hand name={form.signed.name} />
            <View style={{ borderTop: '1 solid #000', paddingTop: 3 }}>
              <Text style={{ color: '#555' }}>Signature</Text>
              <Text>{form.signed.name}</Text>
              <Text style={{ color: '#555' }}>
                {form.signed.role}, {form.signed.day}
              </Text>
            </View>
          </View>
        )}
      </Page>
    </Document>,
  );
}

/** A name as a pen draws it: one loop for each letter, the same for the same name. */
function Hand({ name }: { name: string }) {
  const loops = Array.from(name.replace(/\W/g, ''), (letter, at) => {
    const high = 6 + (letter.charCodeAt(0) % 7) * 2.4;
    const x = 12 + at * 11;
    return `C${x} ${34 - high} ${x + 9} ${30 - high} ${x + 7} 30S${x + 3} 38 ${x + 11} 29`;
  }).join('');
  return (
    <Svg width={190} height={44} viewBox="0 0 190 44">
      <Path d={`M4 31${loops}`} stroke="#1d2f6f" strokeWidth={1.1} fill="none" />
    </Svg>
  );
}

function Row({ cells, head = false }: { cells: readonly string[]; head?: boolean }) {
  return (
    <View
      style={{
        flexDirection: 'row',
        ...(head ? { borderBottom: '1 solid #000' } : { borderTop: '0.5 solid #bbb' }),
      }}
    >
      {cells.map((cell, at) => (
        <Text
          key={at}
          style={{
            ...style.cell,
            ...(head ? { color: '#555' } : { fontFamily: 'Spline Sans Mono', fontSize: 8.6 }),
          }}
        >
          {cell}
        </Text>
      ))}
    </View>
  );
}
