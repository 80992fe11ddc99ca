/**
 * Nine numbers, row by row, that carry a point of one plane to another: (x', y') / w'.
 * Turning, straightening and the correction of a photograph's perspective are all of this form.
 */
export type Projection = readonly [number, number, number, number, number, number, number, number, number];
export type Point = readonly [x: number, y: number];

export const SAME_PLACE: Projection = [1, 0, 0, 0, 1, 0, 0, 0, 1];

export const scaling = (x: number, y: number): Projection => [x, 0, 0, 0, y, 0, 0, 0, 1];

export function project([a, b, c, d, e, f, g, h, i]: Projection, x: number, y: number): Point {
  const w = g * x + h * y + i;
  return [(a * x + b * y + c) / w, (d * x + e * y + f) / w];
}

/** The projection that does `first` and then `next`. */
export function chainProjections(first: Projection, next: Projection): Projection {
  const [a, b, c, d, e, f, g, h, i] = next;
  const [p, q, r, s, t, u, v, w, x] = first;
  return [
    a * p + b * s + c * v,
    a * q + b * t + c * w,
    a * r + b * u + c * x,
    d * p + e * s + f * v,
    d * q + e * t + f * w,
    d * r + e * u + f * x,
    g * p + h * s + i * v,
    g * q + h * t + i * w,
    g * r + h * u + i * x,
  ];
}

/** The way back. Up to a common factor, which a projection does not feel. */
export function inverseOf([a, b, c, d, e, f, g, h, i]: Projection): Projection {
  return [
    e * i - f * h,
    c * h - b * i,
    b * f - c * e,
    f * g - d * i,
    a * i - c * g,
    c * d - a * f,
    d * h - e * g,
    b * g - a * h,
    a * e - b * d,
  ];
}

/** Carries the corners (0,0), (1,0), (1,1), (0,1) of a square to four points, no three of them on one line. */
export function squareOnto([p0, p1, p2, p3]: readonly [Point, Point, Point, Point]): Projection {
  const dx = p0[0] - p1[0] + p2[0] - p3[0];
  const dy = p0[1] - p1[1] + p2[1] - p3[1];
  const [dx1, dx2, dy1, dy2] = [p1[0] - p2[0], p3[0] - p2[0], p1[1] - p2[1], p3[1] - p2[1]];
  const determinant = dx1 * dy2 - dx2 * dy1;
  const g = (dx * dy2 - dx2 * dy) / determinant;
  const h = (dx1 * dy - dx * dy1) / determinant;
  return [
    p1[0] - p0[0] + g * p1[0],
    p3[0] - p0[0] + h * p3[0],
    p0[0],
    p1[1] - p0[1] + g * p1[1],
    p3[1] - p0[1] + h * p3[1],
    p0[1],
    g,
    h,
    1,
  ];
}

/** Turns a `width` × `height` plane clockwise by whole quarters; its new upper left corner is the origin. */
export function quarterTurn(degrees: 0 | 90 | 180 | 270, width: number, height: number): Projection {
  switch (degrees) {
    case 0:
      return SAME_PLACE;
    case 90:
      return [0, -1, height, 1, 0, 0, 0, 0, 1];
    case 180:
      return [-1, 0, width, 0, -1, height, 0, 0, 1];
    case 270:
      return [0, 1, 0, -1, 0, width, 0, 0, 1];
  }
}

/** Turns a plane clockwise about its middle. Radians. */
export function rotationAbout(radians: number, x: number, y: number): Projection {
  const [cos, sin] = [Math.cos(radians), Math.sin(radians)];
  return [cos, -sin, x - cos * x + sin * y, sin, cos, y - sin * x - cos * y, 0, 0, 1];
}
