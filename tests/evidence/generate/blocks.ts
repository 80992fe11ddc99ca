import type { Paper, TextStyle } from './sheet-of-paper';

/** Left edge and width, in points. */
export type Across = readonly [x: number, width: number];

/** Headings, whose lines are parted by a line break, and the cells under them. */
export interface Grid {
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

export interface Pair {
  readonly label: string;
  readonly value: string;
}

export interface PairStyle {
  readonly labelWidth: number;
  readonly mark: ':' | '' | '....' | '=';
  readonly boldLabel?: boolean;
  readonly boldValue?: boolean;
  readonly pitch?: number;
}

/** Label left of value. */
export function pairs(paper: Paper, list: readonly Pair[], x: number, style: PairStyle): void {
  const { labelWidth, mark, boldLabel = false, boldValue = false, pitch = 1.6 } = style;
  for (const { label, value } of list) {
    const dots =
      mark === '....'
        ? ` ${'.'.repeat(Math.max(3, Math.floor((labelWidth - paper.widthOf(`${label}  `)) / paper.widthOf('.'))))}`
        : mark;
    paper.text(`${label}${dots}`, x, paper.y, { bold: boldLabel });
    paper.text(value, x + labelWidth + (mark === '....' ? 6 : 0), paper.y, { bold: boldValue });
    paper.y += paper.size * pitch;
  }
}

/** Label and value in one run of words. */
export function inlinePairs(paper: Paper, list: readonly Pair[], x: number, mark: string): void {
  for (const { label, value } of list) {
    paper.text(`${label}${mark} ${value}`, x, paper.y);
    paper.y += paper.size * 1.6;
  }
}

/** Two columns of pairs side by side. */
export function twoColumns(
  paper: Paper,
  list: readonly Pair[],
  x: number,
  { columnWidth, ...style }: PairStyle & { readonly columnWidth: number },
): void {
  const half = Math.ceil(list.length / 2);
  const top = paper.y;
  pairs(paper, list.slice(0, half), x, style);
  const left = paper.y;
  paper.y = top;
  pairs(paper, list.slice(half), x + columnWidth, style);
  paper.y = Math.max(left, paper.y);
}

export interface CardStyle {
  readonly columns: number;
  readonly framed: boolean;
  readonly small?: boolean;
  readonly height?: number;
}

/** Label above value, in boxes side by side. */
export function cards(
  paper: Paper,
  list: readonly Pair[],
  [x, width]: Across,
  { columns, framed, small = true, height = 30 }: CardStyle,
): void {
  const each = width / columns;
  list.forEach(({ label, value }, index) => {
    const left = x + (index % columns) * each;
    const top = paper.y + Math.floor(index / columns) * height;
    if (framed) paper.frame(left, top, each, height);
    paper.text(label, left + 4, top + 9, {
      size: small ? paper.size * 0.7 : paper.size * 0.85,
      grey: framed ? 0 : 0.35,
    });
    paper.text(value, left + 4, top + 9 + paper.size * 1.35, { bold: !framed });
  });
  paper.y += Math.ceil(list.length / columns) * height + paper.size * 1.4;
}

export interface TableStyle {
  readonly rules: 'all' | 'horizontal' | 'none';
  readonly align?: 'left' | 'centre' | 'right';
  readonly pitch?: number;
  readonly headSize?: number;
  readonly shaded?: boolean;
}

/** A table whose columns are as wide as their widest cell, spread over the width. Headings may have two lines. */
export function table(paper: Paper, { heads, rows }: Grid, [x, width]: Across, style: TableStyle): void {
  const { rules, align = 'left', pitch = 1.7, headSize = paper.size, shaded = false } = style;
  const natural = heads.map(
    (head, column) =>
      Math.max(
        ...head.split('\n').map((line) => paper.widthOf(line, { size: headSize, bold: true })),
        ...rows.map((row) => paper.widthOf(row[column] ?? '')),
      ) + 12,
  );
  const spare = Math.max(0, width - natural.reduce((sum, one) => sum + one, 0)) / heads.length;
  const widths = natural.map((one) => one + spare);
  const edges = widths.reduce((all, one) => [...all, (all[all.length - 1] ?? x) + one], [x]);
  const right = edges[edges.length - 1] ?? x;
  const tall = Math.max(...heads.map((head) => head.split('\n').length));
  const top = paper.y;
  const step = paper.size * pitch;
  const headHeight = tall * headSize * 1.2 + 5;
  if (shaded) paper.shade(x, top, right - x, headHeight);
  const put = (text: string, column: number, y: number, text_: TextStyle): void => {
    const left = edges[column] ?? x;
    const room = widths[column] ?? 0;
    const at = { left: left + 4, right: left + room - 4, centre: left + room / 2 }[align];
    paper.text(text, at, y, { ...text_, align });
  };
  heads.forEach((head, column) =>
    head
      .split('\n')
      .forEach((line, turn) =>
        put(line, column, top + headSize * 1.2 * (turn + 1) - 1, { bold: true, size: headSize }),
      ),
  );
  rows.forEach((row, index) =>
    row.forEach((cell, column) => put(cell, column, top + headHeight + step * (index + 0.72), {})),
  );
  const bottom = top + headHeight + step * rows.length;
  if (rules !== 'none') {
    paper.rule([x, top], [right, top]);
    for (let index = 0; index <= rows.length; index += 1)
      paper.rule([x, top + headHeight + step * index], [right, top + headHeight + step * index]);
  }
  if (rules === 'all') for (const edge of edges) paper.rule([edge, top], [edge, bottom]);
  paper.y = bottom + paper.size * 1.6;
}

export function heading(paper: Paper, text: string, x: number, style: TextStyle = {}): void {
  paper.text(text, x, paper.y, { bold: true, size: paper.size * 1.1, ...style });
  paper.y += paper.size * 1.8;
}
