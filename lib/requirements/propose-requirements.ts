import { metalOf } from '@/lib/batches/metal-of';
import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';

import { aluminiumProposals } from './aluminium';
import { bakeProposals, finishProposals } from './finish';
import { insideProposals, inspectionProposals } from './inspection';
import { limitOf } from './limit';
import { passivationProposals } from './passivation';
import { peeningProposals } from './peening';
import { proposal, type AskedLine } from './proposal';
import { sampleAsOrdered } from './sample-as-ordered';
import { steelProposals } from './steel';

/**
 * What the papers of a step should show, with limits in the words of an order, from material, condition, process and
 * specification. Each says the table it was read from and how sure that is; what no table says is not proposed.
 *
 * @example 2024 bare sheet 0.040 in, O to T42 by AMS 2770: solution temperature 910 to 930 °F, soak, quench delay 10 s
 *   or less, 96 h of natural ageing, HRB 63 to 83 with 28.5 to 34.0 % IACS.
 */
export function proposeRequirements(tables: BatchTables, asked: AskedLine): ToProve[] {
  return [...byProcess(tables, asked), ...sample(tables, asked)];
}

function byProcess(tables: BatchTables, asked: AskedLine): ToProve[] {
  const found = metalOf(tables, asked.part);
  const material = found.known === 'yes' ? found.material : null;
  switch (asked.step.process) {
    case 'solution_heat_treat':
    case 'solution_heat_treat_and_age':
    case 'artificial_age':
    case 'anneal':
    case 'harden_and_temper': {
      if (!material) return [];
      const isAluminium = material.family === 'wrought_aluminium';
      return isAluminium
        ? aluminiumProposals(tables, material, asked)
        : steelProposals(tables, material, asked);
    }
    case 'stress_relief':
    case 'embrittlement_relief':
      return bakeProposals(tables, material, asked, asked.step.process);
    case 'fluorescent_penetrant':
    case 'magnetic_particle':
      return inspectionProposals(tables, asked);
    case 'cadmium_plate':
    case 'zinc_plate':
    case 'nickel_plate':
    case 'chromium_plate':
    case 'anodize':
    case 'chemical_film':
    case 'phosphate':
      return finishProposals(tables, material, asked);
    case 'passivation':
      return passivationProposals(tables, asked);
    case 'shot_peen':
      return peeningProposals(tables, asked);
    case 'radiography':
    case 'ultrasonic':
      return insideProposals(asked.step.process, asked);
  }
}

function sample(tables: BatchTables, { pieces, ordering }: AskedLine): ToProve[] {
  const found = pieces === null ? null : sampleAsOrdered(tables, ordering.sampling_plan, pieces);
  if (!found) return [];
  const { inspect, accept, reject, aqlPct, level, severity, source } = found;
  const plan = `AQL ${aqlPct}, level ${level}, ${severity}: accept ${accept}, reject ${reject}`;
  return proposal('Sample size', limitOf({ min: inspect }, 'pc'), source, plan);
}
