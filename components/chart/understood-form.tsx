'use client';
import { SelectField } from '@/components/ui/field';
import { Cell, Row, Table } from '@/components/ui/table';
import type { ChartCorrections } from '@/lib/evidence/chart/corrections';
import { CHANNEL_ROLES, type JudgedChart } from '@/lib/evidence/chart/judged-chart';

interface UnderstoodFormProps {
  understood: JudgedChart['understood'];
  corrections: ChartCorrections;
  onChange: (corrections: ChartCorrections) => void;
}

const DELIMITERS = [
  { value: ',', says: 'comma' },
  { value: ';', says: 'semicolon' },
  { value: '\t', says: 'tab' },
  { value: '|', says: 'stroke' },
  { value: ' ', says: 'spaces' },
] as const;
const DATE_ORDERS = [
  { value: 'DMY', says: 'day, month, year' },
  { value: 'MDY', says: 'month, day, year' },
  { value: 'YMD', says: 'year, month, day' },
] as const;
const ROLE_WORDS = { load: 'load', control: 'control', set_point: 'set point', other: 'other' } as const;
const COLUMNS = [{ says: 'Column' }, { says: 'Is' }, { says: 'Counted' }];

/** How the export was taken: what is guessed wrong is put right here, and the drawing follows at once. */
export function UnderstoodForm({ understood, corrections, onChange }: UnderstoodFormProps) {
  const { delimiter, decimal, unit, time, channels, notes } = understood;
  return (
    <>
      {notes.map((note) => (
        <p key={note} className="py-1 text-second font-medium text-dispatched-ink">
          {note}
        </p>
      ))}
      <div className="grid grid-cols-2 gap-3 py-2">
        <SelectField
          label="Columns parted by"
          options={DELIMITERS}
          value={delimiter}
          onChange={({ currentTarget: { value } }) =>
            onChange({ ...corrections, delimiter: DELIMITERS.find((one) => one.value === value)?.value })
          }
        />
        <SelectField
          label="Decimal sign"
          options={[
            { value: '.', says: 'point' },
            { value: ',', says: 'comma' },
          ]}
          value={decimal}
          onChange={({ currentTarget: { value } }) =>
            onChange({ ...corrections, decimal: value === ',' ? ',' : '.' })
          }
        />
        <SelectField
          label="Degrees in the file"
          options={[
            { value: 'F', says: '°F' },
            { value: 'C', says: '°C' },
          ]}
          value={unit}
          onChange={({ currentTarget: { value } }) =>
            onChange({ ...corrections, unit: value === 'C' ? 'C' : 'F' })
          }
        />
        <SelectField
          label="Order of the date"
          hint={time}
          empty="as found"
          options={DATE_ORDERS}
          value={corrections.dateOrder ?? ''}
          onChange={({ currentTarget: { value } }) =>
            onChange({ ...corrections, dateOrder: DATE_ORDERS.find((one) => one.value === value)?.value })
          }
        />
      </div>
      <Table label="Columns of the file" columns={COLUMNS} dense keep>
        {channels.map((channel) => (
          <ChannelRow key={channel.column} channel={channel} corrections={corrections} onChange={onChange} />
        ))}
      </Table>
    </>
  );
}

interface ChannelRowProps extends Omit<UnderstoodFormProps, 'understood'> {
  channel: JudgedChart['understood']['channels'][number];
}

function ChannelRow({ channel, corrections, onChange }: ChannelRowProps) {
  const { column, name, role, excluded } = channel;
  const own = corrections.channels?.find((one) => one.column === column);
  const say = (said: object) =>
    onChange({
      ...corrections,
      channels: [
        ...(corrections.channels ?? []).filter((one) => one.column !== column),
        { ...own, column, ...said },
      ],
    });
  return (
    <Row>
      <Cell>{name}</Cell>
      <Cell>
        <select
          aria-label={`What ${name} is`}
          className="min-h-6 border border-line bg-field px-1"
          value={role}
          onChange={(event) => say({ role: event.currentTarget.value })}
        >
          {CHANNEL_ROLES.map((one) => (
            <option key={one} value={one}>
              {ROLE_WORDS[one]}
            </option>
          ))}
        </select>
      </Cell>
      <Cell>
        <label className="inline-flex min-h-6 items-center gap-1.5">
          <input
            type="checkbox"
            checked={excluded === null}
            onChange={(event) => say({ excluded: !event.currentTarget.checked })}
          />
          {excluded === null ? 'yes' : excluded.replace('_', ' ')}
        </label>
      </Cell>
    </Row>
  );
}
