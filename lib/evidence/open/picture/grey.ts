/** A picture in shades of grey, row by row: 0 is black, 255 is white. */
export interface Grey {
  readonly width: number;
  readonly height: number;
  readonly data: Uint8Array;
}

/** Which pixels are ink: 1 where there is, 0 elsewhere. Same order as `Grey`. */
export interface Ink {
  readonly width: number;
  readonly height: number;
  readonly data: Uint8Array;
}

/** Left, top, right, bottom in pixels; right and bottom are the first beyond. */
export type PixelBox = readonly [left: number, top: number, right: number, bottom: number];
