import { printResult } from './command';

import { JudgedChart, Understood, UnderstoodChannel } from '@/lib/evidence/chart/judged-chart';
import { readChart } from '@/lib/evidence/chart/read-chart';
import { ChartRequirement } from '@/lib/evidence/chart/requirement';

import { bytesOf, callOf, InputError, numberOf } from './input';

const USAGE =
  'Usage: read:chart FILE --set 920 --tolerance 10 --unit F [--soak-minutes 35] [--soak-minutes-max 60] [--max-quench-delay-s 10]';

/** What `read:chart` prints. */
const PrintedChart = JudgedChart.omit({ facts: true }).extend({
  understood: Understood.pick({ delimiter: true, decimal: true, time: true, unit: true, rows: true }).extend({
    channels: UnderstoodChannel.omit({ column: true }).array(),
  }),
});

const OPTIONS = [
  'set',
  'tolerance',
  'unit',
  'soak-minutes',
  'soak-minutes-max',
  'max-quench-delay-s',
] as const;

await printResult(async (args) => {
  const { file, options } = callOf(args, OPTIONS, USAGE);
  const requirement = ChartRequirement.safeParse({
    set: numberOf('set', options.set),
    tolerance: numberOf('tolerance', options.tolerance),
    unit: options.unit?.replace('°', '').toUpperCase(),
    soakMinutes: numberOf('soak-minutes', options['soak-minutes']),
    soakMinutesMax: numberOf('soak-minutes-max', options['soak-minutes-max']),
    maxQuenchDelayS: numberOf('max-quench-delay-s', options['max-quench-delay-s']),
  });
  const missing = (['set', 'tolerance', 'unit'] as const).filter((name) => options[name] === undefined);
  if (missing.length > 0)
    throw new InputError('usage', `${missing.map((name) => `--${name}`).join(', ')} missing. ${USAGE}`);
  if (!requirement.success) {
    const [issue] = requirement.error.issues;
    throw new InputError('usage', `--${issue?.path.join('.') ?? ''}: ${issue?.message ?? ''}. ${USAGE}`);
  }
  const { bytes } = await bytesOf(file);
  return PrintedChart.parse(readChart(bytes, requirement.data));
});
