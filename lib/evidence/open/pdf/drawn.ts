import type { Box, HiddenText } from '../../page';
import type { Matrix } from './matrix';

/** Red, green, blue from 0 to 255; null where a pattern or a gradient stands for the colour. */
export type Colour = readonly [number, number, number] | null;

/** One character where it was drawn. `from` and `to` run along the run's direction, in points from its origin. */
export interface DrawnGlyph {
  readonly text: string;
  readonly from: number;
  readonly to: number;
}

/** Characters drawn by one operator on one base line. Points of the upright page, y downwards. */
export interface DrawnRun {
  readonly glyphs: readonly DrawnGlyph[];
  /** Where the base line begins. */
  readonly x: number;
  readonly y: number;
  /** Unit vector along which the text runs: [1, 0] is ordinary text. */
  readonly along: readonly [number, number];
  /** Height of the font in points as seen on the page. */
  readonly size: number;
  /** Extra space the file asks for between characters, in points. */
  readonly spacing: number;
  readonly colour: Colour;
  readonly why: HiddenText['why'] | null;
  /** What the page allows to be seen at this place. */
  readonly clip: Box;
  readonly order: number;
}

/** A path that was filled or stroked, as points of the upright page. */
export interface DrawnPath {
  readonly box: Box;
  /** Flattened: curves are given by points along them. */
  readonly lines: readonly (readonly (readonly [number, number])[])[];
  readonly curves: number;
  readonly filled: boolean;
  readonly stroked: boolean;
  readonly fillColour: Colour;
  readonly strokeColour: Colour;
  readonly lineWidth: number;
  readonly opaque: boolean;
  readonly order: number;
}

export interface DrawnPicture {
  readonly box: Box;
  /** From the unit square with y upwards to the page. */
  readonly matrix: Matrix;
  /** Name of the picture in the page's store; null for one that is a mask or stands inline. */
  readonly name: string | null;
  readonly pixelsWide: number;
  readonly pixelsHigh: number;
  /** A mask paints with one colour and leaves holes. */
  readonly mask: boolean;
  readonly visible: boolean;
  readonly order: number;
}

export interface Drawn {
  readonly runs: readonly DrawnRun[];
  readonly paths: readonly DrawnPath[];
  readonly pictures: readonly DrawnPicture[];
}
