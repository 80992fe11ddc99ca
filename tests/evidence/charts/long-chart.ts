/** A chart of many rows, one each second: up in a tenth of them, long in the band, and quenched at the end. */
export function longChart(rows: number, channels: number): Uint8Array {
  const start = Date.UTC(2026, 2, 5, 8);
  const names = Array.from({ length: channels }, (_, at) => `TC${at + 1} (°F)`);
  const lines = [`Date/Time,${names.join(',')}`];
  const [up, out] = [rows / 10, rows - 600];
  const degreesAt = (row: number, channel: number) => {
    if (row > out + 8) return 75 + 820 * Math.exp(-(row - out - 8) / 5);
    if (row > out) return 920 - 2 * (row - out);
    const wave = 3 * Math.sin(row / 300 + channel) + ((row * 7919 + channel * 104_729) % 11) / 10;
    return 70 + 850 * (1 - Math.exp((-row / up) * 6)) + wave * Math.min(1, row / up);
  };
  const pieces: Uint8Array[] = [];
  const encoder = new TextEncoder();
  for (let row = 0; row < rows; row++) {
    const time = new Date(start + row * 1000).toISOString();
    const values = names.map((_, channel) => degreesAt(row, channel).toFixed(1));
    lines.push(`${time.slice(0, 10)} ${time.slice(11, 19)},${values.join(',')}`);
    if (lines.length < 20_000 && row + 1 < rows) continue;
    pieces.push(encoder.encode(`${lines.join('\r\n')}\r\n`));
    lines.length = 0;
  }
  return joinedBytes(pieces);
}

function joinedBytes(pieces: readonly Uint8Array[]): Uint8Array {
  const bytes = new Uint8Array(pieces.reduce((sum, { length }) => sum + length, 0));
  let at = 0;
  for (const piece of pieces) {
    bytes.set(piece, at);
    at += piece.length;
  }
  return bytes;
}
