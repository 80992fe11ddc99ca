import { bathOf, loadsOfBatch } from '@/lib/batches/loads-of-batch';
import { temperOf, type PartMaterial } from '@/lib/parts/material-of';
import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { acceptanceOf } from '@/lib/trade/acceptance/acceptance-of';
import { calledRevision } from '@/lib/trade/finishes/called-revision';
import { ageingCycles, type AgeingCycle } from '@/lib/trade/heat-treat/ageing-cycle';
import { annealCycle } from '@/lib/trade/heat-treat/anneal-cycle';
import { quenchBath } from '@/lib/trade/heat-treat/quench-bath';
import { quenchDelay } from '@/lib/trade/heat-treat/quench-delay';
import { requiredSoak } from '@/lib/trade/heat-treat/required-soak';
import { usableRange } from '@/lib/trade/heat-treat/usable-range';
import type { QuenchRule } from '@/lib/trade/tables/quench-media';
import { celsiusDifferenceFromFahrenheit } from '@/lib/trade/units/temperature';

import { hoursLimit, limitOf, temperatureLimit } from './limit';
import { proposal, proposalInWords, type AskedLine } from './proposal';

/** What papers of a heat treatment of wrought aluminium show, from the load it lies in and the condition it ends in. */
export function aluminiumProposals(tables: BatchTables, material: PartMaterial, asked: AskedLine): ToProve[] {
  const load = asked.load ?? loadsOfBatch(tables, [asked])?.loads[0];
  return [
    ...(load?.solution ? solution(tables, material, asked, { ...load, solution: load.solution }) : []),
    ...ageing(tables, material, asked, load?.ageing ?? []),
    ...(asked.step.process === 'anneal' ? anneal(tables, material, asked) : []),
    ...condition(tables, material, asked),
  ];
}

type Run = NonNullable<AskedLine['load']> & {
  solution: NonNullable<NonNullable<AskedLine['load']>['solution']>;
};

function solution(
  tables: BatchTables,
  { alloy, form, clad }: PartMaterial,
  { part, step, units }: AskedLine,
  { solution: run, maxDelayS }: Run,
): ToProve[] {
  const { medium, quench } = bathOf(step);
  const thicknessMm = part.thicknessMm ?? 0;
  const range = form && form !== 'casting' ? usableRange(tables.loads, { alloy, form, clad }) : null;
  const soak = requiredSoak(tables.loads.soak, { thicknessMm, medium, clad });
  const delay = quenchDelay(tables.loads.quenchDelays, { alloy, thinnestMm: thicknessMm });
  const bath = quenchBath(tables.requirements.quenchBaths, {
    rule: quenchRule(step.specification),
    medium: quench,
  });
  const [low, high] = run.temperatureC;
  const soakLimit = limitOf({ min: run.soakMin, max: run.longestMin ?? undefined }, 'min');
  return [
    ...(range?.ok
      ? proposal('Solution temperature', temperatureLimit({ min: low, max: high }, units), range.source)
      : []),
    ...(soak.ok ? proposal('Soak', soakLimit, soak.source) : []),
    ...(delay.ok && maxDelayS !== null
      ? proposal('Quench delay', limitOf({ max: maxDelayS }, 's'), delay.source)
      : []),
    ...(bath.ok
      ? [
          ...proposalInWords('Quench medium', quench, bath.source),
          ...proposal(
            'Quench medium temperature',
            bath.startC ? temperatureLimit({ min: bath.startC.from, max: bath.startC.to }, units) : null,
            bath.source,
            'at the start',
          ),
        ]
      : []),
  ];
}

/** Documents differ about the bath; the one on the order speaks, and a handbook where it is none of them. */
function quenchRule(specification: string): QuenchRule {
  const names = (...documents: string[]) =>
    documents.some((one) => calledRevision(one, { specification }) !== null);
  if (names('AMS 2770')) return 'ams_2770';
  return names('MIL-H-6088', 'AMS-H-6088') ? 'mil_h_6088g' : 'faa';
}

function ageing(
  tables: BatchTables,
  { alloy, form }: PartMaterial,
  { part, step, units }: AskedLine,
  cycles: readonly AgeingCycle[],
): ToProve[] {
  const [cycle] = cycles;
  if (cycle)
    return cycle.holds.flatMap((hold, at) => {
      const name = cycle.holds.length === 1 ? 'Ageing' : `${at === 0 ? 'First' : 'Second'} ageing`;
      const note = hold.limitsC ? '' : SET_POINT_NOTE;
      const [low, high] = hold.limitsC ?? [hold.setC[0] - FURNACE_C, hold.setC[1] + FURNACE_C];
      const [shortest, longest] = hold.holdMin ?? [hold.nominalMin, undefined];
      const time =
        shortest === longest ? hoursLimit({ min: shortest }) : hoursLimit({ min: shortest, max: longest });
      return [
        ...proposal(
          `${name} temperature`,
          temperatureLimit({ min: low, max: high }, units),
          cycle.source,
          note,
        ),
        ...proposal(`${name} time`, time, cycle.source),
      ];
    });
  const to = temperOf(tables.material.tempers, step.targetCondition ?? part.endCondition);
  if (step.process !== 'solution_heat_treat_and_age' || !to || !form) return [];
  const natural = ageingCycles(tables.loads.ageing, { alloy, form, from: 'AQ', to });
  const [rest] = natural.ok ? natural.cycles.filter(({ kind }) => kind === 'natural') : [];
  return rest ? proposal('Natural ageing', hoursLimit({ min: rest.naturalMin }), rest.source) : [];
}

/** A table that prints a set point alone leaves the band to the furnace. */
const FURNACE_C = celsiusDifferenceFromFahrenheit(10);
const SET_POINT_NOTE = 'a set point there; ± 10 °F is the furnace’s';

function anneal(tables: BatchTables, { alloy }: PartMaterial, { units }: AskedLine): ToProve[] {
  const cycle = annealCycle(tables.requirements.anneals, alloy);
  if (!cycle.ok) return [];
  const held = { min: cycle.holdC - FURNACE_C, max: cycle.holdC + FURNACE_C };
  return [
    ...proposal('Annealing temperature', temperatureLimit(held, units), cycle.source, SET_POINT_NOTE),
    ...proposal('Annealing time', hoursLimit({ min: cycle.holdMin[0], max: cycle.holdMin[1] }), cycle.source),
  ];
}

/** Hardness and conductivity as a pair, of bare metal; clad metal needs a correlation that no table has. */
function condition(tables: BatchTables, { alloy, clad }: PartMaterial, { part, step }: AskedLine): ToProve[] {
  const asked = { alloy, condition: step.targetCondition ?? part.endCondition, isClad: clad };
  const found = acceptanceOf(tables.requirements.acceptance, asked);
  // A worked example of a standard is no limit for parts.
  if (!found.ok || found.band.kind !== 'acceptance') return [];
  const { hardness, iacs, source } = found.band;
  const [first] = hardness;
  const hard = first && limitOf({ min: first.min, max: first.max }, '');
  return [
    ...(hard ? proposal('Hardness', { ...hard, limit: `${first.scale} ${hard.limit}` }, source) : []),
    ...(iacs ? proposal('Conductivity', limitOf({ min: iacs[0], max: iacs[1] }, '% IACS', 1), source) : []),
  ];
}
