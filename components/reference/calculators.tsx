import type { ComponentType } from 'react';

import { AcceptanceCalculator } from './acceptance-calculator';
import { BakeCalculator } from './bake-calculator';
import { BuildUpCalculator } from './build-up-calculator';
import { CladCalculator } from './clad-calculator';
import { ColourCalculator } from './colour-calculator';
import { FitCalculator } from './fit-calculator';
import { HardnessCalculator } from './hardness-calculator';
import { HoldingCalculator } from './holding-calculator';
import { LoadCalculator } from './load-calculator';
import { MassCalculator } from './mass-calculator';
import { PyrometryCalculator } from './pyrometry-calculator';
import { RouteCalculator } from './route-calculator';
import { SampleCalculator } from './sample-calculator';
import { SoakCalculator } from './soak-calculator';
import { SpecificationCalculator } from './specification-calculator';
import { SteelCalculator } from './steel-calculator';
import type { Subject } from './subjects';
import { TemperCalculator } from './temper-calculator';
import type { Given } from './use-bench';

export const CALCULATORS: Record<Subject, ComponentType<{ given: Given }>> = {
  fit: FitCalculator,
  soak: SoakCalculator,
  load: LoadCalculator,
  holding: HoldingCalculator,
  clad: CladCalculator,
  temper: TemperCalculator,
  hardness: HardnessCalculator,
  acceptance: AcceptanceCalculator,
  specification: SpecificationCalculator,
  route: RouteCalculator,
  finish: BuildUpCalculator,
  bake: BakeCalculator,
  samples: SampleCalculator,
  mass: MassCalculator,
  steel: SteelCalculator,
  pyrometry: PyrometryCalculator,
  colours: ColourCalculator,
};
