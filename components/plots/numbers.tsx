import type { ReactNode } from 'react';

interface NumbersProps {
  label: string;
  heads: readonly string[];
  rows: readonly (readonly ReactNode[])[];
}

/** The numbers of a plot or table of the trade, folded on the screen and open on paper. */
export function Numbers({ label, heads, rows }: NumbersProps) {
  return (
    <details className="pt-2 print:open:block">
      <summary className="cursor-pointer font-cond text-word underline">{label}</summary>
      <div className="overflow-x-auto">
        <table className="mt-1.5">
          <thead>
            <tr>
              {heads.map((head, column) => (
                <th
                  key={column}
                  scope="col"
                  className="pr-6 pb-1 text-left font-cond text-caption font-normal text-quiet"
                >
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row, at) => (
              <tr key={at} className="border-t border-rule">
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
    </details>
  );
}
