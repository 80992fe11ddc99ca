import type { Grey } from './grey';

/** A grey below this share of the page's paper is not paper in the shade but a dark area. */
const DARKEST_PAPER = 0.35;
const PAPER_SHARE = 0.88;
/** Of the paper's brightness: from here on all is plain white, and up to here plain black. */
const WHITE = 0.87;
const BLACK = 0.16;
const CONTRAST = 255 / (WHITE - BLACK);

/**
 * Evens the light: paper becomes white wherever it lies, whether under a lamp, in a shadow or of a tint, and ink black.
 *
 * `tile` is the side in pixels of the squares whose paper is measured, about a quarter of an inch.
 */
export function levelLight(picture: Grey, tile: number): Grey {
  const { width, height, data } = picture;
  const columns = Math.max(1, Math.round(width / tile));
  const rows = Math.max(1, Math.round(height / tile));
  const paper = smooth(
    widen(fillGaps(measurePaper(picture, columns, rows), columns, rows), columns, rows),
    columns,
    rows,
  );

  const out = new Uint8Array(width * height);
  const left = new Int32Array(width);
  const share = new Float32Array(width);
  for (let x = 0; x < width; x++) {
    const at = Math.min(columns - 1, Math.max(0, ((x + 0.5) * columns) / width - 0.5));
    left[x] = Math.min(columns - 2, Math.floor(at));
    if (columns === 1) left[x] = 0;
    share[x] = at - (left[x] as number);
  }
  const line = new Float32Array(columns + 1);
  for (let y = 0; y < height; y++) {
    const at = Math.min(rows - 1, Math.max(0, ((y + 0.5) * rows) / height - 0.5));
    const top = Math.max(0, Math.min(rows - 2, Math.floor(at)));
    const fy = at - top;
    const below = Math.min(rows - 1, top + 1);
    for (let c = 0; c < columns; c++) {
      line[c] = (paper[top * columns + c] as number) * (1 - fy) + (paper[below * columns + c] as number) * fy;
    }
    line[columns] = line[columns - 1] as number;
    for (let x = 0, p = y * width; x < width; x++, p++) {
      const c = left[x] as number;
      const f = share[x] as number;
      const ground = (line[c] as number) * (1 - f) + (line[c + 1] as number) * f;
      const value = ((data[p] as number) / ground - BLACK) * CONTRAST;
      out[p] = value > 255 ? 255 : Math.max(0, value);
    }
  }
  return { width, height, data: out };
}

/** The grey that all but the brightest pixels of a tile stay under. */
function measurePaper({ width, height, data }: Grey, columns: number, rows: number): Float32Array {
  const paper = new Float32Array(columns * rows);
  const counts = new Uint32Array(256);
  for (let row = 0; row < rows; row++) {
    const [top, bottom] = [Math.floor((row * height) / rows), Math.floor(((row + 1) * height) / rows)];
    for (let column = 0; column < columns; column++) {
      const [left, right] = [
        Math.floor((column * width) / columns),
        Math.floor(((column + 1) * width) / columns),
      ];
      counts.fill(0);
      let total = 0;
      for (let y = top; y < bottom; y += 2) {
        for (let x = left; x < right; x += 2) {
          const value = data[y * width + x] as number;
          counts[value] = (counts[value] as number) + 1;
          total++;
        }
      }
      let value = 255;
      for (let seen = 0; value > 0; value--) {
        seen += counts[value] as number;
        if (seen > total * (1 - PAPER_SHARE)) break;
      }
      paper[row * columns + column] = value;
    }
  }
  return paper;
}

/** Dark areas show no paper; theirs is taken from around them. */
function fillGaps(paper: Float32Array, columns: number, rows: number): Float32Array {
  const sorted = Float32Array.from(paper).sort();
  const usual = sorted[Math.floor(sorted.length * 0.8)] ?? 255;
  const filled = paper.map((value) => (value < usual * DARKEST_PAPER ? 0 : value));
  for (let pass = 0; pass < columns + rows && filled.includes(0); pass++) {
    const before = Float32Array.from(filled);
    before.forEach((value, at) => {
      if (value > 0) return;
      const around = neighbours(before, at, columns, rows).filter((other) => other > 0);
      if (around.length > 0) filled[at] = around.reduce((sum, other) => sum + other, 0) / around.length;
    });
  }
  return filled.map((value) => Math.max(value, 16));
}

/** A tile full of print takes the paper of the brightest tile beside it. */
const widen = (paper: Float32Array, columns: number, rows: number) =>
  paper.map((_, at) => Math.max(...neighbours(paper, at, columns, rows)));

const smooth = (paper: Float32Array, columns: number, rows: number) =>
  paper.map((_, at) => {
    const around = neighbours(paper, at, columns, rows);
    return around.reduce((sum, value) => sum + value, 0) / around.length;
  });

function neighbours(paper: Float32Array, at: number, columns: number, rows: number): number[] {
  const [row, column] = [Math.floor(at / columns), at % columns];
  const found: number[] = [];
  for (let r = Math.max(0, row - 1); r <= Math.min(rows - 1, row + 1); r++) {
    for (let c = Math.max(0, column - 1); c <= Math.min(columns - 1, column + 1); c++) {
      found.push(paper[r * columns + c] as number);
    }
  }
  return found;
}
