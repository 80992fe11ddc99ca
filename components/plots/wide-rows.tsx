import type { ReactNode } from 'react';

interface WideRowsProps {
  heads: readonly string[];
  rows: readonly (readonly ReactNode[])[];
  /** Of the place that is scrolled, where it stands open on a page. */
  label?: string;
}

/** A table of the trade as printed, however many columns it has: it is pushed sideways, never the page. */
export function WideRows({ heads, rows, label }: WideRowsProps) {
  return (
    <div
      className="overflow-x-auto"
      {...(label !== undefined && { role: 'region', 'aria-label': label, tabIndex: 0 })}
    >
      <table className="mt-1.5">
        <thead>
          <tr>
            {heads.map((head, column) => (
              <th
                key={column}
                scope="col"
                className="pr-6 pb-1 text-left align-bottom font-cond text-caption font-normal text-quiet"
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, at) => (
            <tr key={at} className="border-t border-rule align-top">
              {row.map((cell, column) => (
                <td key={column} className="num py-1 pr-6">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
