import { z } from 'zod';

import { ChartCorrections } from '@/lib/evidence/chart/corrections';
import { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import { ChartRequirement } from '@/lib/evidence/chart/requirement';

/** What a chart was held against, how a person said it is to be understood, and what came of it. */
export const KeptChart = z.object({
  requirement: ChartRequirement,
  corrections: ChartCorrections,
  judged: JudgedChart,
});
export type KeptChart = z.output<typeof KeptChart>;
