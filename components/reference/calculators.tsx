import type { ComponentType } from 'react';

import { FitCalculator } from './fit-calculator';
import { SoakCalculator } from './soak-calculator';
import type { Subject } from './subjects';
import type { Given } from './use-bench';

export const CALCULATORS: Record<Subject, ComponentType<{ given: Given }>> = {
  fit: FitCalculator,
  soak: SoakCalculator,
};
