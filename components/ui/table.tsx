import type { ComponentProps, ReactNode } from 'react';

export interface Column {
  says: ReactNode;
  /** Figures stand right; so does their name. */
  right?: boolean;
  /** Which way the list is ordered by this column. */
  sorted?: 'up' | 'down';
  /** A page that orders by it; the component behind `says` may also be a button. */
  className?: string;
  /** Where the name would only repeat what the eye sees, a reader still hears it. */
  hidden?: boolean;
}

interface TableProps {
  /** What the table lists, for those who hear it. */
  label: string;
  columns: readonly Column[];
  children: ReactNode;
  /** 31 px rows, as in Prove. */
  dense?: boolean;
  /** Stays a table however narrow it gets: only for two or three short columns. */
  keep?: boolean;
  className?: string;
}

/** Rows, sums and groups go in as children. */
export function Table({ label, columns, children, dense = false, keep = false, className = '' }: TableProps) {
  return (
    <div className={`lw-table-box ${className}`}>
      <table
        role="table"
        aria-label={label}
        className={`lw-table ${dense ? 'lw-table-dense' : ''} ${keep ? 'lw-table-keep' : ''}`}
      >
        <thead role="rowgroup" className={columns.every((column) => column.hidden) ? 'sr-only' : ''}>
          <tr role="row">
            {columns.map((column, index) => (
              <ColumnName key={index} column={column} />
            ))}
          </tr>
        </thead>
        {/* The roles are given again because a narrow row is drawn as a block, which would silence them. */}
        <tbody role="rowgroup">{children}</tbody>
      </table>
    </div>
  );
}

function ColumnName({ column }: { column: Column }) {
  const sorted = column.sorted && ({ up: 'ascending', down: 'descending' } as const)[column.sorted];
  return (
    <th
      role="columnheader"
      scope="col"
      aria-sort={sorted}
      className={`${column.right ? 'lw-figure' : ''} ${column.className ?? ''}`}
    >
      {column.hidden ? <span className="sr-only">{column.says}</span> : column.says}
      {column.sorted && <span aria-hidden="true"> {column.sorted === 'up' ? '▴' : '▾'}</span>}
    </th>
  );
}

interface RowProps extends Omit<ComponentProps<'tr'>, 'className'> {
  /** `asks` for a decision, `off` cannot be used, `sum` closes the table. */
  state?: 'rest' | 'asks' | 'off' | 'sum';
  selected?: boolean;
  className?: string;
}

/** `J` and `K` walk along rows that hold something to open. */
export function Row({ state = 'rest', selected, className = '', ...row }: RowProps) {
  const states = { rest: '', asks: 'lw-asks', off: 'lw-off', sum: 'lw-sum' };
  return (
    <tr
      role="row"
      {...(state === 'sum' ? {} : { 'data-row': '' })}
      aria-selected={selected}
      className={`${states[state]} ${className}`}
      {...row}
    />
  );
}

interface CellProps extends Omit<ComponentProps<'td'>, 'className'> {
  /** A figure: right, mono. */
  figure?: boolean;
  /** A number or code: left, mono. */
  code?: boolean;
  right?: boolean;
  strong?: boolean;
  quiet?: boolean;
  /** The column's name, said before the value where the row is drawn as a block. */
  head?: string;
  className?: string;
}

export function Cell({ figure, code, right, strong, quiet, head, className = '', ...cell }: CellProps) {
  const classes = [
    figure && 'lw-figure',
    code && 'lw-code',
    right && 'text-right',
    strong && 'lw-strong',
    quiet && 'text-quiet',
    className,
  ];
  return <td role="cell" data-head={head} className={classes.filter(Boolean).join(' ')} {...cell} />;
}

/** A heading inside the table: "Late 2". */
export function GroupRow({ says, count, span }: { says: ReactNode; count?: number; span: number }) {
  return (
    <tr role="row" className="lw-group">
      <th role="rowheader" scope="rowgroup" colSpan={span}>
        {says} {count !== undefined && <span className="font-normal text-quiet">{count}</span>}
      </th>
    </tr>
  );
}
