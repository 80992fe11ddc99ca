import type { ReactNode } from 'react';

import { COLOURS, COND, MONO, SANS } from './look';

/** A paragraph of the text. */
export function Say({ quiet = false, children }: { quiet?: boolean; children: ReactNode }) {
  return (
    <p style={{ margin: '0 0 10px', font: `15px/22px ${SANS}`, color: quiet ? COLOURS.quiet : COLOURS.ink }}>
      {children}
    </p>
  );
}

/** Numbers and codes. */
export function Num({ children }: { children: ReactNode }) {
  return <span style={{ fontFamily: MONO, fontSize: '0.93em', letterSpacing: '-0.01em' }}>{children}</span>;
}

/** The one filled button of a mail, and at most one beside it. Each also stands in the text part with its address. */
export function Actions({
  primary,
  second,
}: {
  primary: { says: string; url: string };
  second?: { says: string; url: string } | undefined;
}) {
  return (
    <table
      role="presentation"
      cellPadding={0}
      cellSpacing={0}
      style={{ borderCollapse: 'separate', width: '100%', margin: '14px 0 0' }}
    >
      <tbody>
        <tr>
          <td style={{ background: COLOURS.ink, textAlign: 'center', verticalAlign: 'middle' }}>
            <a
              href={primary.url}
              style={{
                display: 'block',
                padding: '12px 8px',
                color: COLOURS.paper,
                font: `600 18px/24px ${COND}`,
                textDecoration: 'none',
              }}
            >
              {primary.says}
            </a>
          </td>
          {second && <td data-skip-in-text="true" style={{ width: 12 }} />}
          {second && (
            <td
              style={{
                width: 96,
                border: `1.5px solid ${COLOURS.ink}`,
                textAlign: 'center',
                verticalAlign: 'middle',
              }}
            >
              <a
                href={second.url}
                style={{
                  display: 'block',
                  padding: '10px 0',
                  color: COLOURS.ink,
                  font: `600 18px/24px ${COND}`,
                  textDecoration: 'none',
                }}
              >
                {second.says}
              </a>
            </td>
          )}
        </tr>
      </tbody>
    </table>
  );
}

/** Beside the work it is about: a straw edge. */
export function Caution({ children }: { children: ReactNode }) {
  return (
    <Edged colour={COLOURS.straw} ink={COLOURS.strawInk}>
      {children}
    </Edged>
  );
}

/** What somebody wrote, in their words and their lines. */
export function Quote({ children, trouble = false }: { children: string; trouble?: boolean }) {
  return (
    <Edged colour={trouble ? COLOURS.red : COLOURS.ink} ink={COLOURS.ink}>
      {children.split('\n').map((line, at) => (
        <span key={at}>
          {at > 0 && <br />}
          {line}
        </span>
      ))}
    </Edged>
  );
}

function Edged({ colour, ink, children }: { colour: string; ink: string; children: ReactNode }) {
  return (
    <p
      style={{
        margin: '12px 0',
        padding: '2px 0 2px 10px',
        borderLeft: `4px solid ${colour}`,
        font: `15px/22px ${SANS}`,
        color: ink,
      }}
    >
      {children}
    </p>
  );
}

interface Column {
  says: string;
  figure?: boolean;
  /** A number or code, which must not be broken. */
  code?: boolean;
}

interface ListTableProps {
  columns: readonly Column[];
  rows: readonly (readonly string[])[];
  /** Closes the table, cell by cell. */
  sum?: readonly string[] | undefined;
}

/** Lines with their numbers; in the text part the same columns, set with spaces. */
export function ListTable({ columns, rows, sum }: ListTableProps) {
  return (
    <table
      data-text-format="dataTable"
      width="100%"
      cellPadding={0}
      cellSpacing={0}
      style={{
        width: '100%',
        margin: '6px 0 0',
        borderCollapse: 'collapse',
        borderTop: `2px solid ${COLOURS.ink}`,
        font: `14px/20px ${SANS}`,
      }}
    >
      <thead>
        <tr>
          {columns.map((column) => (
            <th
              key={column.says}
              scope="col"
              style={{
                padding: '4px 8px 4px 0',
                borderBottom: `1px solid ${COLOURS.ink}`,
                font: `400 13px/15px ${COND}`,
                color: COLOURS.faint,
                textAlign: column.figure ? 'right' : 'left',
              }}
            >
              {column.says}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row, at) => (
          <tr key={at}>{row.map((value, column) => cell(value, column, columns))}</tr>
        ))}
        {sum && <tr>{sum.map((value, column) => cell(value, column, columns, true))}</tr>}
      </tbody>
    </table>
  );
}

function cell(value: string, at: number, columns: readonly Column[], closes = false) {
  const { figure = false, code = false } = columns[at] ?? {};
  return (
    <td
      key={at}
      style={{
        padding: '6px 8px 6px 0',
        borderBottom: closes ? 0 : `1px solid ${COLOURS.rule}`,
        textAlign: figure ? 'right' : 'left',
        verticalAlign: 'top',
        fontWeight: closes ? 600 : 400,
        ...(figure || (code && !closes)
          ? { fontFamily: MONO, fontSize: 13, whiteSpace: 'nowrap' as const }
          : {}),
      }}
    >
      {value}
    </td>
  );
}
