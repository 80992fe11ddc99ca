import { computedMassOf } from '@/lib/parts/computed-mass';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { APART_WORDS } from '@/lib/reference/load-words';

import type { CheckedLine } from './check';
import type { LoadPlan, PlannedLoad } from './load-contract';
import { loadsOfBatch, soakAlone, type LoadOfLines } from './loads-of-batch';
import { notPlannedWords } from './not-planned-words';
import { sourceWords } from './source-words';

/** The plan of a batch as its screen and its traveller tell it: loads counted from 1, sources in words. */
export function loadPlanOf(tables: BatchTables, lines: readonly CheckedLine[]): LoadPlan {
  const plan = loadsOfBatch(tables, lines);
  if (!plan) return { method: null, loads: [], apart: [], unplaced: [], isSet: false };
  return {
    method: plan.method,
    loads: plan.loads.map((load, at) => plannedLoad(tables, load, at + 1)),
    apart: plan.apart.map(({ between: [one, other], reason, sources: [source] }) => ({
      between: [one.map(({ lineNo }) => lineNo), other.map(({ lineNo }) => lineNo)],
      reason,
      says: APART_WORDS[reason],
      source: source ? sourceWords(source) : null,
    })),
    unplaced: plan.unplaced.map(({ line, reason }) => ({
      lineId: line.id,
      lineNo: line.lineNo,
      reason,
      says: notPlannedWords(reason),
    })),
    isSet: isSet(plan.loads.map((load) => load.lines)),
  };
}

/** What is known of one load, whether planned or set by hand. */
export function plannedLoad(
  tables: BatchTables,
  load: LoadOfLines<CheckedLine>,
  number: number,
): PlannedLoad {
  const { solution, governing, lines } = load;
  return {
    number,
    lines: lines.map((line) => ({
      lineId: line.id,
      lineNo: line.lineNo,
      partName: line.partName,
      thickness: thicknessWords(line),
      clad: line.part.clad,
      soak: solution && soakAlone(tables, line),
    })),
    governing: {
      lineId: governing.id,
      lineNo: governing.lineNo,
      thickness: thicknessWords(governing),
      thicknessMm: load.governingMm,
    },
    pieces: lines.reduce((sum, { pieces }) => sum + pieces, 0),
    mass: massOf(tables, lines),
    solution: solution && {
      temperatureC: [...solution.temperatureC],
      soakMin: solution.soakMin,
      longestMin: solution.longestMin,
      medium: load.medium,
      quench: load.quench,
      maxDelayS: load.maxDelayS,
    },
    ageing: load.ageing.map(({ holds, source }) => ({
      holds: holds.map(({ setC, holdMin, nominalMin }) => ({
        setC: [...setC],
        holdMin: nominalMin === undefined ? (holdMin ? [...holdMin] : null) : [nominalMin, nominalMin], // eslint-disable-line no-nested-ternary -- one of three
      })),
      source: sourceWords(source),
    })),
    sources: [...new Set(load.sources.map(sourceWords))],
  };
}

const thicknessWords = ({ part }: CheckedLine): string => part.thickness ?? `${part.thicknessMm ?? '?'} mm`;

/** Of all pieces: as their parts say it, computed where they do not. Null where one of them is known neither way. */
export function massOf(
  tables: BatchTables,
  lines: readonly CheckedLine[],
): { massG: number; isComputed: boolean } | null {
  const each = lines.map(({ part, pieces }) => {
    const massG = part.massG ?? computedMassOf(tables, part)?.massG;
    return massG === undefined ? null : massG * pieces;
  });
  const known = each.filter((massG) => massG !== null);
  if (known.length < each.length) return null;
  return {
    massG: known.reduce((sum, massG) => sum + massG, 0),
    isComputed: lines.some(({ part }) => part.massG === null),
  };
}

/** Whether the lines lie as planned: those of one load share a number that no other load has. */
function isSet(loads: readonly (readonly CheckedLine[])[]): boolean {
  const numbers = loads.map((lines) => {
    const [first, ...others] = new Set(lines.map(({ loadNo }) => loadNo));
    return others.length === 0 ? (first ?? null) : null;
  });
  return numbers.length > 0 && !numbers.includes(null) && new Set(numbers).size === numbers.length;
}
