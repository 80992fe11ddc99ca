import type { ChartCorrections } from './corrections';
import { judgedChart, seenIn } from './judge';
import type { JudgedChart } from './judged-chart';
import { recordingOf } from './recording';
import type { ChartRequirement } from './requirement';

/**
 * Reads a furnace recorder's export and judges it.
 *
 * @param file the bytes as they came, CSV, TSV or text in any dialect, 1 to 40 channels.
 * @param requirement what the chart must show.
 * @param corrections what a person said about how the file is to be understood.
 * @throws UnreadableFile where it holds no table of times and temperatures.
 */
export const readChart = (
  file: Uint8Array,
  requirement: ChartRequirement,
  corrections: ChartCorrections = {},
): JudgedChart => judgedChart(seenIn(recordingOf(file, requirement, corrections), requirement));
