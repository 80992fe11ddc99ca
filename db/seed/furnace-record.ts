const EVERY_S = 4;
const [COLD_F, SET_F, WATER_F] = [75, 920, 78];
const HEATING_MIN = 38;
const QUENCH_S = 8;
/** How fast each couple follows the furnace, per minute: the last is the heaviest piece. */
const COUPLES = [0.085, 0.081, 0.076];

/**
 * A furnace recorder's export of one solution treatment: heating, soak at 920 °F, the quench. Three couples in the load
 * and one that controls; the same figures make the same file.
 */
export function recordOfSolution({ endedAt, soakedMin }: { endedAt: Date; soakedMin: number }): Buffer {
  const lasts = (HEATING_MIN + soakedMin + 4) * 60;
  const began = endedAt.getTime() - lasts * 1000;
  const out = (HEATING_MIN + soakedMin) * 60;
  const rows = Array.from({ length: Math.floor(lasts / EVERY_S) }, (_, row) => {
    const second = row * EVERY_S;
    const time = new Date(began + second * 1000).toISOString().slice(0, 19).replace('T', ' ');
    const wave = 1.4 * Math.sin(second / 210) + 0.6 * Math.sin(second / 47);
    const couples = COUPLES.map((rate) => coupleAt(second, { rate, out }) + wave);
    const control = second < out ? Math.min(SET_F, COLD_F + second * 0.9) + wave : SET_F - 60 + wave;
    return [time, SET_F, ...[control, ...couples].map((degrees) => degrees.toFixed(1))].join(',');
  });
  const head = 'Furnace 2, air, class 2\nLoad A\n';
  return Buffer.from(`${head}Time,Set point F,Control F,TC1 F,TC2 F,TC3 F\n${rows.join('\n')}\n`);
}

/** Follows the furnace until the door opens, then falls to the water. */
function coupleAt(second: number, { rate, out }: { rate: number; out: number }): number {
  const heated = SET_F - (SET_F - COLD_F) * Math.exp(-rate * Math.pow(second / 60, 1.22));
  if (second < out) return heated;
  if (second < out + QUENCH_S) return heated - 3 * (second - out + EVERY_S);
  return WATER_F + (heated - 3 * QUENCH_S - WATER_F) * Math.exp(-(second - out - QUENCH_S + EVERY_S) / 9);
}
