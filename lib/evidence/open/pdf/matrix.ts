/** x' = a·x + c·y + e, y' = b·x + d·y + f, as PDF writes it. */
export type Matrix = readonly [a: number, b: number, c: number, d: number, e: number, f: number];

export const IDENTITY: Matrix = [1, 0, 0, 1, 0, 0];

/** The matrix that does `inner` first and `outer` afterwards. */
export function compose(outer: Matrix, inner: Matrix): Matrix {
  const [a, b, c, d, e, f] = outer;
  const [p, q, r, s, t, u] = inner;
  return [a * p + c * q, b * p + d * q, a * r + c * s, b * r + d * s, a * t + c * u + e, b * t + d * u + f];
}

export const xOf = (m: Matrix, x: number, y: number) => m[0] * x + m[2] * y + m[4];
export const yOf = (m: Matrix, x: number, y: number) => m[1] * x + m[3] * y + m[5];
