import type { Across } from './blocks';
import type { Paper } from './sheet-of-paper';

export interface Cell {
  readonly label: string;
  readonly value: string;
  /** Of the width, beside the others of its row. */
  readonly share?: number;
}

/** A row of framed cells, each with its small label in the upper left corner; a long value breaks into lines. */
export function cellRow(
  paper: Paper,
  [x, width]: Across,
  cells: readonly Cell[],
  { labelSize = paper.size * 0.65, framed = true }: { labelSize?: number; framed?: boolean } = {},
): void {
  const whole = cells.reduce((sum, { share = 1 }) => sum + share, 0);
  const laid = cells.map((cell) => {
    const room = (width * (cell.share ?? 1)) / whole;
    return { ...cell, room, lines: paper.linesOf(cell.value, room - 8) };
  });
  const height = labelSize * 1.5 + Math.max(...laid.map(({ lines }) => lines.length)) * paper.size * 1.2 + 4;
  let left = x;
  for (const { label, lines, room } of laid) {
    if (framed) paper.frame(left, paper.y, room, height);
    paper.text(label, left + 3, paper.y + labelSize + 1, { size: labelSize, grey: framed ? 0 : 0.3 });
    lines.forEach((line, turn) =>
      paper.text(line, left + 4, paper.y + labelSize * 1.5 + paper.size * (1 + 1.2 * turn)),
    );
    left += room;
  }
  paper.y += height;
}

export interface Column {
  readonly head: string;
  readonly width: number;
  readonly align?: 'left' | 'right' | 'centre';
}

export interface FixedStyle {
  readonly rules: 'all' | 'columns' | 'heads' | 'none';
  readonly headSize?: number;
  readonly pitch?: number;
  readonly boldHeads?: boolean;
}

/** A table with columns of given widths, whose cells and headings break into lines where they are too long. */
export function fixedTable(
  paper: Paper,
  x: number,
  { columns, rows }: { readonly columns: readonly Column[]; readonly rows: readonly (readonly string[])[] },
  { rules, headSize = paper.size * 0.8, pitch = 1.2, boldHeads = true }: FixedStyle,
): void {
  const edges = columns.reduce((all, { width }) => [...all, (all[all.length - 1] ?? x) + width], [x]);
  const right = edges[edges.length - 1] ?? x;
  const top = paper.y;
  const across = (): void => {
    if (rules === 'all') paper.rule([x, paper.y], [right, paper.y]);
  };
  const put = (cells: readonly string[], size: number, bold: boolean): void => {
    const laid = columns.map(({ width }, index) =>
      paper.linesOf(cells[index] ?? '', width - 6, { size, bold }),
    );
    columns.forEach(({ width, align = 'left' }, index) => {
      const left = edges[index] ?? x;
      const at = { left: left + 3, right: left + width - 3, centre: left + width / 2 }[align];
      (laid[index] ?? []).forEach((line, turn) =>
        paper.text(line, at, paper.y + size * (1.1 + pitch * turn), { size, bold, align }),
      );
    });
    paper.y += Math.max(...laid.map((lines) => lines.length)) * size * pitch + size * 0.45;
  };
  across();
  put(
    columns.map(({ head }) => head),
    headSize,
    boldHeads,
  );
  if (rules === 'heads' || rules === 'columns') paper.rule([x, paper.y], [right, paper.y]);
  for (const row of rows) {
    across();
    put(row, paper.size, false);
  }
  across();
  if (rules === 'all' || rules === 'columns')
    for (const edge of edges) paper.rule([edge, top], [edge, paper.y]);
  paper.y += paper.size * 1.5;
}

/** A box to tick and what it stands for; gives back where the next one may begin. */
export function tickBox(
  paper: Paper,
  [x, y]: readonly [number, number],
  { said, ticked }: { readonly said: string; readonly ticked: boolean },
): number {
  const side = paper.size * 0.85;
  paper.frame(x, y - side + 0.5, side, side);
  if (ticked) {
    paper.rule([x + 1, y - side + 1.5], [x + side - 1, y - 0.5], 1.1);
    paper.rule([x + side - 1, y - side + 1.5], [x + 1, y - 0.5], 1.1);
  }
  paper.text(said, x + side + 4, y);
  return x + side + 4 + paper.widthOf(said) + 14;
}
