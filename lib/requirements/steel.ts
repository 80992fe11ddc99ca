import type { PartMaterial } from '@/lib/parts/material-of';
import { strengthRangeOf } from '@/lib/parts/strength-of';
import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { phCondition } from '@/lib/trade/steel/ph-condition';
import { steelWindow } from '@/lib/trade/steel/steel-window';
import { temperWindow } from '@/lib/trade/steel/temper-window';
import { ksiFromMpa } from '@/lib/trade/units/stress';

import { hoursLimit, limitOf, temperatureLimit } from './limit';
import { proposal, type AskedLine } from './proposal';

/** What papers of a heat treatment of steel show, by the strength or condition that it ends in. */
export function steelProposals(tables: BatchTables, material: PartMaterial, asked: AskedLine): ToProve[] {
  const condition = asked.step.targetCondition ?? asked.part.endCondition;
  switch (asked.step.process) {
    case 'harden_and_temper':
      return [...hardening(tables, material, asked, condition), ...statedStrength(condition)];
    case 'artificial_age':
      return phAgeing(tables, material, asked, condition);
    case 'anneal':
      return window(tables, material, asked, { operation: 'anneal' });
    default:
      return [];
  }
}

function window(
  tables: BatchTables,
  { alloy }: PartMaterial,
  { units }: AskedLine,
  { operation, tensileMpaMax }: { operation: 'anneal' | 'austenitize'; tensileMpaMax?: number | undefined },
): ToProve[] {
  const found = steelWindow(tables.requirements.steelWindows, {
    steel: alloy,
    operation,
    ...(tensileMpaMax !== undefined && { tensileMpaMax }),
  });
  if (!found.ok) return [];
  const name = operation === 'anneal' ? 'Annealing temperature' : 'Austenitizing temperature';
  const span = { min: found.temperatureCMin, max: found.temperatureCMax };
  return proposal(name, temperatureLimit(span, units), found.source);
}

function hardening(
  tables: BatchTables,
  material: PartMaterial,
  asked: AskedLine,
  condition: string,
): ToProve[] {
  const { tensileMpa } = strengthRangeOf(condition);
  const austenitize = window(tables, material, asked, {
    operation: 'austenitize',
    tensileMpaMax: tensileMpa?.[1],
  });
  if (!tensileMpa) return austenitize;
  const found = temperWindow(
    { tempering: tables.requirements.steelTempering, bands: tables.route.temperBands },
    { steel: material.alloy, tensileMpaMin: tensileMpa[0], tensileMpaMax: tensileMpa[1] },
  );
  if (!found.ok) return austenitize;
  const span = { min: found.temperatureCMin, max: found.temperatureCMax };
  return [
    ...austenitize,
    ...proposal(
      'Tempering temperature',
      temperatureLimit(span, asked.units),
      found.source,
      found.times === 2 ? 'twice; the hardness decides' : 'where to begin; the hardness decides',
    ),
  ];
}

/** What the drawing asks for is what must be shown. */
function statedStrength(condition: string): ToProve[] {
  const { tensileMpa, hrc } = strengthRangeOf(condition);
  const from = { source: 'drawing', sourceText: `condition ${condition.trim()}`.slice(0, 200) } as const;
  const hard = hrc && limitOf({ min: hrc[0], max: hrc[1] }, '');
  const isKsi = /ksi/i.test(condition);
  const strong =
    tensileMpa &&
    limitOf(
      isKsi
        ? { min: Math.round(ksiFromMpa(tensileMpa[0])), max: Math.round(ksiFromMpa(tensileMpa[1])) }
        : { min: tensileMpa[0], max: tensileMpa[1] },
      isKsi ? 'ksi' : 'MPa',
    );
  return [
    ...(hard ? [{ characteristic: 'Hardness', ...hard, limit: `HRC ${hard.limit}`, ...from }] : []),
    ...(strong ? [{ characteristic: 'Tensile strength', ...strong, ...from }] : []),
  ];
}

function phAgeing(
  tables: BatchTables,
  { alloy }: PartMaterial,
  { units }: AskedLine,
  condition: string,
): ToProve[] {
  const found = phCondition(tables.phConditions, { steel: alloy, condition: condition.trim().toUpperCase() });
  if (!found.ok) return [];
  const { temperatureC, toleranceC, soakMin, soakMinMax, hrcMin, hrcMax, source } = found;
  const span = { min: temperatureC - toleranceC, max: temperatureC + toleranceC };
  const hard = limitOf({ min: hrcMin, max: hrcMax }, '');
  return [
    ...proposal('Ageing temperature', temperatureLimit(span, units), source),
    ...proposal('Ageing time', hoursLimit({ min: soakMin, max: soakMinMax }), source),
    ...proposal('Hardness', hard && { ...hard, limit: `HRC ${hard.limit}` }, source),
  ];
}
