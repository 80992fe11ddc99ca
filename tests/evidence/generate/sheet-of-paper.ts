import { PDFDocument, rgb, StandardFonts, type PDFFont, type PDFPage } from 'pdf-lib';

export type Face = 'Helvetica' | 'Times' | 'Courier';

/** Plain, bold, and the slanted one that word processors offer for signing. */
const FACES: Record<Face, readonly [StandardFonts, StandardFonts, StandardFonts]> = {
  Helvetica: [StandardFonts.Helvetica, StandardFonts.HelveticaBold, StandardFonts.TimesRomanItalic],
  Times: [StandardFonts.TimesRoman, StandardFonts.TimesRomanBold, StandardFonts.TimesRomanItalic],
  Courier: [StandardFonts.Courier, StandardFonts.CourierBold, StandardFonts.TimesRomanItalic],
};

type Point = readonly [number, number];

export interface TextStyle {
  readonly size?: number;
  readonly bold?: boolean;
  readonly slanted?: boolean;
  readonly align?: 'left' | 'centre' | 'right';
  readonly grey?: number;
}

/** A PDF being written from top to bottom; places are in points from the upper left corner. */
export class Paper {
  private page: PDFPage;
  readonly width: number;
  readonly height: number;
  y = 0;

  private constructor(
    private readonly document: PDFDocument,
    private readonly fonts: readonly [PDFFont, PDFFont, PDFFont],
    [width, height]: Point,
    readonly size: number,
  ) {
    this.width = width;
    this.height = height;
    this.page = document.addPage([this.width, this.height]);
  }

  static async open(face: Face, size: number, [width, height]: readonly [number, number]): Promise<Paper> {
    const document = await PDFDocument.create();
    const when = new Date('2026-01-01T00:00:00Z');
    document.setCreationDate(when);
    document.setModificationDate(when);
    const [plain, bold, slanted] = FACES[face];
    return new Paper(
      document,
      [await document.embedFont(plain), await document.embedFont(bold), await document.embedFont(slanted)],
      [width, height],
      size,
    );
  }

  turnPage(): void {
    this.page = this.document.addPage([this.width, this.height]);
    this.y = 40;
  }

  private fontOf({ bold = false, slanted = false }: TextStyle): PDFFont {
    if (slanted) return this.fonts[2];
    return this.fonts[bold ? 1 : 0];
  }

  widthOf(text: string, style: TextStyle = {}): number {
    return this.fontOf(style).widthOfTextAtSize(text, style.size ?? this.size);
  }

  /** Text whose letters stand on `y`. */
  text(text: string, x: number, y: number, style: TextStyle = {}): void {
    const { size = this.size, align = 'left', grey = 0 } = style;
    const wide = this.widthOf(text, style);
    const left = { left: x, right: x - wide, centre: x - wide / 2 }[align];
    this.page.drawText(text, {
      x: left,
      y: this.height - y,
      size,
      font: this.fontOf(style),
      color: rgb(grey, grey, grey),
    });
  }

  /** Letters set apart one by one, as headings are. */
  spaced(text: string, x: number, y: number, style: TextStyle & { readonly gap: number }): void {
    const wide = [...text].reduce((sum, letter) => sum + this.widthOf(letter, style) + style.gap, -style.gap);
    let at = { left: x, right: x - wide, centre: x - wide / 2 }[style.align ?? 'left'];
    for (const letter of text) {
      if (letter !== ' ') this.text(letter, at, y, { ...style, align: 'left' });
      at += this.widthOf(letter, style) + style.gap;
    }
  }

  /** The lines that a text breaks into within a width; a line break in it stays one. */
  linesOf(text: string, width: number, style: TextStyle = {}): string[] {
    return text.split('\n').flatMap((paragraph) => {
      const lines: string[] = [];
      let line = '';
      for (const word of paragraph.split(' ')) {
        const longer = line === '' ? word : `${line} ${word}`;
        if (this.widthOf(longer, style) > width && line !== '') {
          lines.push(line);
          line = word;
        } else line = longer;
      }
      return [...lines, line];
    });
  }

  /** Text broken into lines; moves down. */
  prose(text: string, x: number, width: number, style: TextStyle = {}): void {
    const size = style.size ?? this.size;
    for (const line of this.linesOf(text, width, style)) {
      this.text(line, x, this.y, style);
      this.y += size * 1.3;
    }
  }

  rule([x1, y1]: Point, [x2, y2]: Point, thickness = 0.6): void {
    this.page.drawLine({
      start: { x: x1, y: this.height - y1 },
      end: { x: x2, y: this.height - y2 },
      thickness,
    });
  }

  frame(x: number, y: number, width: number, height: number): void {
    this.page.drawRectangle({
      x,
      y: this.height - y - height,
      width,
      height,
      borderWidth: 0.7,
      borderColor: rgb(0, 0, 0),
    });
  }

  circle(x: number, y: number, radius: number): void {
    this.page.drawEllipse({
      x,
      y: this.height - y,
      xScale: radius,
      yScale: radius,
      borderWidth: 1,
      borderColor: rgb(0.15, 0.15, 0.5),
    });
  }

  shade(x: number, y: number, width: number, height: number): void {
    this.page.drawRectangle({ x, y: this.height - y - height, width, height, color: rgb(0.9, 0.9, 0.9) });
  }

  /** What a pen leaves on a line that begins at `x` and `y`. */
  sign(x: number, y: number, seed: number): void {
    const strokes = Array.from({ length: 7 }, (_, step) => {
      const across = 12 + ((seed >> step) % 5);
      const up = 6 + ((seed * (step + 3)) % 11);
      return `q ${across / 2} ${step % 2 === 0 ? -up : up} ${across} ${step % 2 === 0 ? 2 : -2}`;
    });
    this.page.drawSvgPath(`M 0 0 ${strokes.join(' ')}`, {
      x,
      y: this.height - y + 4,
      borderWidth: 1.2,
      borderColor: rgb(0.1, 0.1, 0.45),
    });
  }

  /** A signature kept as a picture and pasted in: its left bottom corner, and its size. */
  async paste(png: Uint8Array, [x, y]: Point, [width, height]: Point): Promise<void> {
    const picture = await this.document.embedPng(png);
    this.page.drawImage(picture, { x, y: this.height - y, width, height });
  }

  save(): Promise<Uint8Array> {
    return this.document.save();
  }
}
