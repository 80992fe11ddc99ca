import type { PartMaterial } from '@/lib/parts/material-of';
import { routePartOf } from '@/lib/parts/route-part-of';
import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { finishAsOrdered } from '@/lib/trade/finishes/finish-as-ordered';
import { isHardenable } from '@/lib/trade/route/needs-of-plating';
import { isPlating } from '@/lib/trade/route/step-kinds';
import { relief } from '@/lib/trade/steel/relief';

import { coatingLimit, limitOf, temperatureLimit } from './limit';
import { proposal, type AskedLine } from './proposal';

/** What papers of a finish show, by its specification, class and type; and the bake after it, of strong steel. */
export function finishProposals(
  tables: BatchTables,
  material: PartMaterial | null,
  asked: AskedLine,
): ToProve[] {
  return [
    ...coating(tables, asked),
    ...(isPlating(asked.step) ? bakeProposals(tables, material, asked) : []),
  ];
}

const WEIGHT_UNITS = { 'mg/ft2': 'mg/ft²', 'g/m2': 'g/m²' } as const;

function coating(tables: BatchTables, { step, units }: AskedLine): ToProve[] {
  const ordered = finishAsOrdered(tables.route, {
    specification: step.specification,
    revision: step.specificationRevision,
    classType: step.classType ?? '',
  });
  if (!ordered.ok) return [];
  const thick = ordered.facts.find(({ thickness }) => thickness);
  const heavy = ordered.facts.find(({ weight }) => weight);
  const sprayed = ordered.facts.find(({ saltSprayHours }) => saltSprayHours !== undefined);
  return [
    ...(thick?.thickness
      ? proposal(
          'Coating thickness',
          coatingLimit({ min: thick.thickness.minMm, max: thick.thickness.maxMm }, units),
          thick.source,
        )
      : []),
    ...(heavy?.weight
      ? proposal(
          'Coating weight',
          limitOf({ min: heavy.weight.min, max: heavy.weight.max }, WEIGHT_UNITS[heavy.weight.unit]),
          heavy.source,
        )
      : []),
    ...(sprayed ? proposal('Salt spray', limitOf({ min: sprayed.saltSprayHours }, 'h'), sprayed.source) : []),
  ];
}

/** The relief of hydrogen after plating, or of stress before it, where the document asks for it at the revision called. */
export function bakeProposals(
  tables: BatchTables,
  material: PartMaterial | null,
  { step, part, units }: AskedLine,
  treatment: 'embrittlement_relief' | 'stress_relief' = 'embrittlement_relief',
): ToProve[] {
  const steel = material && routePartOf(tables.phConditions, material, part.endCondition);
  if (!steel || !isHardenable(steel)) return [];
  const called = { specification: step.specification, revision: step.specificationRevision };
  const found = relief(tables.route, treatment, called, steel);
  if (!found.ok || !found.isRequired) return [];
  const { temperatureCMin, temperatureCMax, hours, startWithinHours, source } = found;
  const name = treatment === 'stress_relief' ? 'Stress relief' : 'Bake';
  return [
    ...proposal(
      `${name} temperature`,
      temperatureLimit({ min: temperatureCMin, max: temperatureCMax }, units),
      source,
    ),
    ...proposal(`${name} time`, limitOf({ min: hours }, 'h'), source),
    ...proposal(`${name} start`, limitOf({ max: startWithinHours }, 'h'), source, 'after plating'),
  ];
}
