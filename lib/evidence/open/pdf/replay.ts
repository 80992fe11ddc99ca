import { OPS } from 'pdfjs-dist/legacy/build/pdf.mjs';
import type { Box } from '../../page';
import { boxThrough, intersection } from '../box';
import { drawText, type Glyph } from './draw-text';
import { flattenPath } from './draw-path';
import type { Drawn, DrawnPath, DrawnPicture, DrawnRun } from './drawn';
import { initialState, type FontMetrics, type GraphicsState } from './graphics-state';
import { compose, IDENTITY, type Matrix } from './matrix';
import { isNumbers, nameIn, sizeOf, toBox, toColour, toMatrix, toNumber } from './operands';

/** What the replay needs from the page it replays. */
export interface Stage {
  /** From the file's space to points of the upright page. */
  readonly matrix: Matrix;
  readonly page: Box;
  fontNamed(name: string): FontMetrics | null;
  /** Whether a layer that can be switched on and off is on. */
  layerIsOn(properties: unknown): boolean;
}

const FILLS: ReadonlySet<number> = new Set([
  OPS.fill,
  OPS.eoFill,
  OPS.fillStroke,
  OPS.eoFillStroke,
  OPS.closeFillStroke,
  OPS.closeEOFillStroke,
]);
const STROKES: ReadonlySet<number> = new Set([
  OPS.stroke,
  OPS.closeStroke,
  OPS.fillStroke,
  OPS.eoFillStroke,
  OPS.closeFillStroke,
  OPS.closeEOFillStroke,
]);
const UNIT: Box = [0, 0, 1, 1];

/** Plays a page's operators without painting: tells what was drawn where, in the order of painting. */
export function replay(
  operators: { readonly fnArray: readonly number[]; readonly argsArray: readonly unknown[] },
  stage: Stage,
): Drawn {
  const player = new Player(stage);
  for (let i = 0; i < operators.fnArray.length; i++) {
    const args = operators.argsArray[i];
    player.play(operators.fnArray[i] ?? 0, Array.isArray(args) ? (args as unknown[]) : [], i);
  }
  return player.drawn;
}

class Player {
  readonly drawn = { runs: [] as DrawnRun[], paths: [] as DrawnPath[], pictures: [] as DrawnPicture[] };
  private state: GraphicsState;
  private readonly saved: GraphicsState[] = [];
  private readonly layers: boolean[] = [];
  private clipPending = false;

  constructor(private readonly stage: Stage) {
    this.state = initialState(stage.matrix, stage.page);
  }

  play(operator: number, args: readonly unknown[], order: number): void {
    ACTIONS[operator]?.(this, args, order);
  }

  get visible() {
    return !this.layers.includes(false);
  }

  save() {
    this.saved.push({ ...this.state });
  }

  restore() {
    this.state = this.saved.pop() ?? this.state;
  }

  set(change: Partial<GraphicsState>) {
    Object.assign(this.state, change);
  }

  transform(matrix: Matrix | null) {
    if (matrix) this.state.matrix = compose(this.state.matrix, matrix);
  }

  clipTo(box: Box | null) {
    if (box) this.state.clip = intersection(this.state.clip, boxThrough(this.state.matrix, box));
  }

  clipAtNextPath() {
    this.clipPending = true;
  }

  beginAnnotation(rect: Box | null, transform: Matrix | null, matrix: Matrix | null) {
    this.save();
    this.state = initialState(this.stage.matrix, this.stage.page);
    this.clipTo(rect);
    this.transform(transform);
    this.transform(matrix);
  }

  beginLayer(tag: unknown, properties: unknown) {
    this.layers.push(tag === 'OC' ? this.stage.layerIsOn(properties) : true);
  }

  endLayer() {
    this.layers.pop();
  }

  setFont(name: unknown, size: unknown) {
    this.set({
      font: typeof name === 'string' ? this.stage.fontNamed(name) : null,
      fontSize: toNumber(size),
    });
  }

  setMany(entries: unknown) {
    for (const [key, value] of Array.isArray(entries) ? (entries as [string, unknown][]) : []) {
      if (key === 'ca') this.set({ fillAlpha: toNumber(value) });
      else if (key === 'CA') this.set({ strokeAlpha: toNumber(value) });
      else if (key === 'BM') this.set({ blends: value !== 'source-over' });
      else if (key === 'LW') this.set({ lineWidth: toNumber(value) });
      else if (key === 'Font' && Array.isArray(value)) this.setFont(value[0], value[1]);
    }
  }

  moveText(x: number, y: number) {
    const { lineX, lineY } = this.state;
    this.set({ x: lineX + x, lineX: lineX + x, y: lineY + y, lineY: lineY + y });
  }

  nextLine() {
    this.moveText(0, this.state.leading);
  }

  showText(glyphs: unknown, order: number) {
    if (!Array.isArray(glyphs)) return;
    this.drawn.runs.push(...drawText(this.state, glyphs as (Glyph | number | null)[], order, this.visible));
  }

  paintPath(paint: number, data: unknown, order: number) {
    const { state } = this;
    const coded = Array.isArray(data) ? (data[0] as unknown) : null;
    const flat = coded instanceof Float32Array ? flattenPath(coded, state.matrix) : null;
    if (this.clipPending && flat) state.clip = intersection(state.clip, flat.box);
    this.clipPending = false;
    const filled = FILLS.has(paint) && state.fillAlpha > 0;
    const stroked = STROKES.has(paint) && state.strokeAlpha > 0;
    if (!flat || !this.visible || (!filled && !stroked) || flat.lines.length === 0) return;
    const scale = Math.sqrt(Math.abs(state.matrix[0] * state.matrix[3] - state.matrix[1] * state.matrix[2]));
    this.drawn.paths.push({
      ...flat,
      box: intersection(flat.box, state.clip),
      filled,
      stroked,
      fillColour: state.fillColour,
      strokeColour: state.strokeColour,
      lineWidth: state.lineWidth * scale,
      opaque: state.fillAlpha > 0.95 && !state.blends,
      order,
    });
  }

  /** `matrix` places the picture's unit square within the current space. */
  paintPicture(
    picture: Pick<DrawnPicture, 'name' | 'mask' | 'pixelsWide' | 'pixelsHigh'>,
    order: number,
    matrix = IDENTITY,
  ) {
    const whole = compose(this.state.matrix, matrix);
    this.drawn.pictures.push({
      ...picture,
      matrix: whole,
      box: intersection(boxThrough(whole, UNIT), this.state.clip),
      visible: this.visible && this.state.fillAlpha > 0.05,
      mask: picture.mask || this.state.blends || this.state.fillAlpha < 0.95,
      order,
    });
  }
}

type Action = (player: Player, args: readonly unknown[], order: number) => void;

/** A picture repeated at many places: each place is one picture. */
const paintRepeated =
  (mask: boolean): Action =>
  (player, args, order) => {
    const [what, scaleX, third, fourth] = args;
    const [skewX, skewY] = mask ? [toNumber(third), toNumber(fourth)] : [0, 0];
    const scaleY = mask ? args[4] : third;
    const positions = mask ? args[5] : fourth;
    if (!isNumbers(positions)) return;
    const size = sizeOf(what);
    for (let i = 0; i + 1 < positions.length; i += 2) {
      const place: Matrix = [
        toNumber(scaleX),
        skewX,
        skewY,
        toNumber(scaleY),
        positions[i] ?? 0,
        positions[i + 1] ?? 0,
      ];
      player.paintPicture({ name: mask ? null : nameIn(what), mask, ...size }, order, place);
    }
  };

const ACTIONS: Readonly<Record<number, Action>> = {
  [OPS.save]: (p) => p.save(),
  [OPS.restore]: (p) => p.restore(),
  [OPS.transform]: (p, args) => p.transform(toMatrix(args)),
  [OPS.setGState]: (p, [entries]) => p.setMany(entries),
  [OPS.setLineWidth]: (p, [width]) => p.set({ lineWidth: toNumber(width) }),
  [OPS.setFillRGBColor]: (p, [colour]) => p.set({ fillColour: toColour(colour) }),
  [OPS.setStrokeRGBColor]: (p, [colour]) => p.set({ strokeColour: toColour(colour) }),
  [OPS.setFillColorN]: (p) => p.set({ fillColour: null }),
  [OPS.setStrokeColorN]: (p) => p.set({ strokeColour: null }),
  [OPS.clip]: (p) => p.clipAtNextPath(),
  [OPS.eoClip]: (p) => p.clipAtNextPath(),
  [OPS.constructPath]: (p, [paint, data], order) => p.paintPath(toNumber(paint), data, order),
  [OPS.beginText]: (p) => p.set({ textMatrix: IDENTITY, x: 0, y: 0, lineX: 0, lineY: 0 }),
  [OPS.setCharSpacing]: (p, [n]) => p.set({ charSpacing: toNumber(n) }),
  [OPS.setWordSpacing]: (p, [n]) => p.set({ wordSpacing: toNumber(n) }),
  [OPS.setHScale]: (p, [n]) => p.set({ horizontalScale: toNumber(n) / 100 }),
  [OPS.setLeading]: (p, [n]) => p.set({ leading: -toNumber(n) }),
  [OPS.setFont]: (p, [name, size]) => p.setFont(name, size),
  [OPS.setTextRenderingMode]: (p, [n]) => p.set({ renderMode: toNumber(n) }),
  [OPS.setTextRise]: (p, [n]) => p.set({ rise: toNumber(n) }),
  [OPS.moveText]: (p, [x, y]) => p.moveText(toNumber(x), toNumber(y)),
  [OPS.setLeadingMoveText]: (p, [x, y]) => {
    p.set({ leading: toNumber(y) });
    p.moveText(toNumber(x), toNumber(y));
  },
  [OPS.setTextMatrix]: (p, [matrix]) =>
    p.set({ textMatrix: toMatrix(matrix) ?? IDENTITY, x: 0, y: 0, lineX: 0, lineY: 0 }),
  [OPS.nextLine]: (p) => p.nextLine(),
  [OPS.showText]: (p, [glyphs], order) => p.showText(glyphs, order),
  [OPS.showSpacedText]: (p, [glyphs], order) => p.showText(glyphs, order),
  [OPS.nextLineShowText]: (p, [glyphs], order) => {
    p.nextLine();
    p.showText(glyphs, order);
  },
  [OPS.beginMarkedContent]: (p) => p.beginLayer(null, null),
  [OPS.beginMarkedContentProps]: (p, [tag, properties]) => p.beginLayer(tag, properties),
  [OPS.endMarkedContent]: (p) => p.endLayer(),
  [OPS.paintFormXObjectBegin]: (p, [matrix, box]) => {
    p.save();
    p.transform(toMatrix(matrix));
    p.clipTo(toBox(box));
  },
  [OPS.paintFormXObjectEnd]: (p) => p.restore(),
  [OPS.beginGroup]: (p) => p.save(),
  [OPS.endGroup]: (p) => p.restore(),
  [OPS.beginAnnotation]: (p, [, rect, transform, matrix]) =>
    p.beginAnnotation(toBox(rect), toMatrix(transform), toMatrix(matrix)),
  [OPS.endAnnotation]: (p) => p.restore(),
  [OPS.paintImageXObject]: (p, [name, wide, high], order) =>
    p.paintPicture(
      { name: nameIn(name), mask: false, pixelsWide: toNumber(wide), pixelsHigh: toNumber(high) },
      order,
    ),
  [OPS.paintInlineImageXObject]: (p, [image], order) =>
    p.paintPicture({ name: null, mask: false, ...sizeOf(image) }, order),
  [OPS.paintImageMaskXObject]: (p, [image], order) =>
    p.paintPicture({ name: null, mask: true, ...sizeOf(image) }, order),
  [OPS.paintImageMaskXObjectGroup]: (p, [images], order) => {
    for (const image of Array.isArray(images) ? (images as { transform?: unknown }[]) : []) {
      p.paintPicture(
        { name: null, mask: true, ...sizeOf(image) },
        order,
        toMatrix(image.transform) ?? IDENTITY,
      );
    }
  },
  [OPS.paintInlineImageXObjectGroup]: (p, [image, map], order) => {
    for (const { transform } of Array.isArray(map) ? (map as { transform?: unknown }[]) : []) {
      p.paintPicture({ name: null, mask: false, ...sizeOf(image) }, order, toMatrix(transform) ?? IDENTITY);
    }
  },
  [OPS.paintImageXObjectRepeat]: paintRepeated(false),
  [OPS.paintImageMaskXObjectRepeat]: paintRepeated(true),
};
