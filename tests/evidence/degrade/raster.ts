/** A picture of a page: four bytes a pixel, red, green, blue, opacity. */
export interface Raster {
  readonly width: number;
  readonly height: number;
  readonly data: Uint8ClampedArray;
  readonly dpi: number;
}

export const blank = (width: number, height: number, dpi: number): Raster => ({
  width,
  height,
  dpi,
  data: new Uint8ClampedArray(width * height * 4).fill(255),
});
