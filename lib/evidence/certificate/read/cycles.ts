import type { Process } from '../../../trade/process';
import { passageFrom, type Passage, type Spot } from '../../layout/passage';
import { TRUST, type Answer } from './answers';
import { cycleAttributesIn, type CycleAttributes } from './cycle-attributes';
import { completeTimes, type ReadCycle, type ReadValue } from './cycle-times';
import { dayOf } from './dates';
import type { LabelKey } from './labels';
import { timesIn, type FoundMoment } from './moments';
import type { Paper } from './paper';
import { stepsIn, type Step } from './steps';
import { localMinute, type WorkDays, workDaysOf } from './work-days';

interface Observation {
  readonly step: Step;
  readonly attributes: CycleAttributes;
  readonly trust: number;
  /** Of the load into and out of the furnace; where the soak's own times are stated they count. */
  readonly isLoading?: boolean;
  /** For the day of a time without one. */
  readonly row: string | null;
  readonly order: number;
}

/** A label without a step asks about the step that the process is named after. */
const MAIN_STEP: Partial<Record<Process, Step>> = {
  solution_heat_treat_and_age: 'solution',
  solution_heat_treat: 'solution',
  harden_and_temper: 'austenitize',
  stress_relief: 'stress_relief',
  artificial_age: 'artificial_age',
  anneal: 'anneal',
  embrittlement_relief: 'embrittlement_relief',
};
const BAKED: ReadonlySet<Process> = new Set([
  'cadmium_plate',
  'zinc_plate',
  'nickel_plate',
  'chromium_plate',
]);

const CYCLE_KEYS: ReadonlySet<LabelKey> = new Set([
  'temperature',
  'minutes',
  'time_in',
  'time_out',
  'bake',
  'bake_start',
  'bake_end',
  'process',
  'condition',
  'quench_medium',
  'result',
]);
const LOADING = /load|charge/;
const BAKE_KEYS: ReadonlySet<LabelKey> = new Set(['bake', 'bake_start', 'bake_end']);

/** The cycles that were run, each step once, in the order in which the document has them. */
export function readCycles(paper: Paper, process: Process | null): ReadCycle[] {
  const days = workDaysOf(paper);
  const seenAll = [...asked(paper, process), ...said(paper, process)];
  const observations = [
    ...seenAll.filter((one) => !one.isLoading),
    ...seenAll.filter((one) => one.isLoading),
  ];
  const cycles: ReadCycle[] = [];
  for (const seen of observations) {
    const step = settled(seen, process, observations);
    if (!step) continue;
    let cycle = cycles.find((one) => one.step === step);
    if (!cycle) {
      cycle = { step };
      cycles.push(cycle);
    }
    take(cycle, seen, paper, days);
  }
  for (const cycle of cycles) completeTimes(cycle);
  return cycles.filter(({ temperature, minutes, start, end }) => temperature ?? minutes ?? start ?? end);
}

function asked(paper: Paper, process: Process | null): Observation[] {
  let begun: { step: Step; order: number } | null = null;
  return paper.answers.flatMap((answer): Observation[] => {
    if (!CYCLE_KEYS.has(answer.key) || answer.also.includes('requirement')) return [];
    // A finish is a coating, or the end of a soak when a time stands there.
    const finished =
      answer.key === 'process' && answer.words === 'finish' && timesIn(textOf(answer)).length > 0;
    const key = finished ? 'time_out' : answer.key;
    // "Baked from …" on one line, "to …" on the next.
    const goesOn = key === 'time_out' && begun !== null && answer.order - begun.order < 2100;
    const step = stepOf({ ...answer, key }, process) ?? (goesOn ? (begun?.step ?? null) : null);
    if (step && (key === 'bake_start' || key === 'time_in')) begun = { step, order: answer.order };
    if (!step || isTimeOfDay(answer, paper)) return [];
    for (const { passage, how } of answer.values) {
      const attributes = cycleAttributesIn(
        passage,
        paper.decimal,
        key,
        `${answer.qualifier} ${answer.words}`,
      );
      if (!fits(key, attributes, passage)) continue;
      return [
        {
          step,
          attributes,
          trust: TRUST[how] * (answer.step || answer.section ? 1 : 0.95),
          isLoading: LOADING.test(answer.words),
          row: answer.row,
          order: answer.order,
        },
      ];
    }
    return [];
  });
}

/** "Time" alone, beside a column of days, is when and not how long: "Date 04/07/2026 | Time 10:17". */
const isTimeOfDay = (answer: Answer, paper: Paper): boolean =>
  answer.key === 'minutes' &&
  /^(?:time|zeit|heure|hora|ora)$/.test(answer.words) &&
  /^\s*\d{1,2}:\d\d\s*$/.test(textOf(answer)) &&
  answer.row !== null &&
  paper.answers.some(({ row, key }) => row === answer.row && key === 'date');

const textOf = ({ values }: Answer): string => values[0]?.passage.text ?? '';

function stepOf(answer: Answer, process: Process | null): Step | null {
  if (BAKE_KEYS.has(answer.key)) return /stress/.test(answer.words) ? 'stress_relief' : bakeStep(process);
  // "Achieved 900 °F for 44 min" in a step's part of the form.
  if (answer.key === 'result') return answer.row === null ? (answer.step ?? answer.section) : null;
  if (answer.key === 'process' || answer.key === 'condition' || answer.key === 'quench_medium') {
    const named = answer.step ?? stepsIn(answer.words)[0]?.step ?? null;
    return answer.key === 'quench_medium' ? null : named;
  }
  return (
    answer.step ??
    answer.section ??
    (process
      ? (MAIN_STEP[process] ?? (BAKED.has(process) && isBakeTime(answer) ? 'embrittlement_relief' : null))
      : null)
  );
}

const bakeStep = (process: Process | null): Step =>
  process === 'stress_relief' ? 'stress_relief' : 'embrittlement_relief';
const isBakeTime = ({ words }: Answer): boolean => /oven|bake|soak/.test(words);

/** The label's question is answered; a name of a process that says nothing more is no observation. */
function fits(key: LabelKey, attributes: CycleAttributes, passage: Passage): boolean {
  const { temperature, minutes, start, end } = attributes;
  switch (key) {
    case 'temperature':
      return temperature !== undefined || /room|ambient|raum/i.test(passage.text);
    case 'minutes':
      return minutes !== undefined || (start !== undefined && end !== undefined);
    case 'time_in':
    case 'bake_start':
      return start !== undefined;
    case 'time_out':
    case 'bake_end':
      return end !== undefined;
    default:
      return (temperature ?? minutes ?? start ?? end) !== undefined;
  }
}

/** Sentences and lines that name a step: what stands from there to the next step is of it. */
function said(paper: Paper, process: Process | null): Observation[] {
  return paper.paragraphs.flatMap((paragraph, index) => {
    const steps = stepsIn(paragraph.text);
    const sole =
      process === 'stress_relief' && steps.length === 0
        ? [{ step: 'stress_relief' as const, start: 0, end: 0 }]
        : steps;
    return sole.flatMap((step, turn): Observation[] => {
      const until = sole[turn + 1]?.start ?? paragraph.text.length;
      const before = turn === 0 ? headOf(paragraph, step.start) : step.start;
      const region = passageFrom(paragraph, before, until);
      const attributes = cycleAttributesIn(region, paper.decimal, null, '');
      if (!(attributes.temperature ?? attributes.minutes ?? attributes.start)) return [];
      return [
        {
          step: step.step,
          attributes,
          trust: steps.length === 0 ? 0.4 : 0.72,
          row: null,
          order: 1e9 + index * 100 + turn,
        },
      ];
    });
  });
}

/** A sentence may give the figures first: "38 minutes at 920°F solution heat treatment". */
function headOf({ text }: Passage, start: number): number {
  const stop = Math.max(text.lastIndexOf('. ', start), text.lastIndexOf('; ', start));
  return stop < 0 ? 0 : stop + 1;
}

/** Ageing without heat is natural, with heat artificial, whatever the word was. */
function settled(
  { step, attributes }: Observation,
  process: Process | null,
  all: readonly Observation[],
): Step | null {
  if (step === 'artificial_age') {
    const hot = all.some((other) => other.step === 'artificial_age' && isHot(other.attributes.temperature));
    const natural = all.some((other) => other.step === 'natural_age');
    if (!hot && (natural || !isHot(attributes.temperature))) return 'natural_age';
  }
  if (step === 'temper' && process === 'solution_heat_treat_and_age') return null;
  if (step === 'austenitize' && process === 'solution_heat_treat_and_age') return null;
  if (step === 'embrittlement_relief' && process === 'stress_relief') return 'stress_relief';
  return step;
}

const isHot = (temperature: CycleAttributes['temperature']): boolean =>
  temperature !== undefined && (temperature.unit === 'C' ? temperature.value > 60 : temperature.value > 140);

function take(
  cycle: ReadCycle,
  { attributes, trust, row, order }: Observation,
  paper: Paper,
  days: WorkDays,
): void {
  const { temperature, minutes, start, end } = attributes;
  if (temperature && !cycle.temperature) {
    cycle.temperature = { value: temperature.value, spot: temperature.spot, trust };
    const unit = temperature.unit ?? usualUnit(paper, temperature.value);
    if (unit) cycle.unit = unit;
  }
  if (minutes) cycle.minutes ??= { value: Math.round(minutes.value * 10) / 10, spot: minutes.spot, trust };
  const moment = (found: { moment: FoundMoment; spot: Spot } | undefined): ReadValue<string> | undefined => {
    if (!found) return undefined;
    const day = found.moment.day ? dayOf(found.moment.day, paper.dayOrder) : days.at(row, order);
    const value = localMinute(day, found.moment.time);
    return value === null
      ? undefined
      : { value, spot: found.spot, trust: found.moment.day ? trust : trust * 0.9 };
  };
  const from = moment(start);
  if (from) cycle.start ??= from;
  const withStartDay =
    cycle.start && end && !end.moment.day && !days.hasTwo(row)
      ? afterStart(cycle.start.value, end.moment.time)
      : null;
  const to = withStartDay && end ? { value: withStartDay, spot: end.spot, trust: trust * 0.95 } : moment(end);
  if (to) {
    if (!cycle.end && end && !end.moment.day && !days.hasTwo(row)) cycle.endsOnUnsaidDay = true;
    cycle.end ??= to;
  }
}

/** A time without a day ends on the day of the start, or on the next when it is earlier in the day. */
function afterStart(start: string, time: string | null): string | null {
  if (time === null) return null;
  const same = `${start.slice(0, 10)}T${time}`;
  if (same >= start) return same;
  const next = new Date(Date.parse(`${start.slice(0, 10)}T00:00:00Z`) + 86_400_000);
  return `${next.toISOString().slice(0, 10)}T${time}`;
}

/** Where the unit stands once for the whole document. */
function usualUnit({ text }: Paper, value: number): 'F' | 'C' | null {
  const fahrenheit = /°\s?F\b|\bdeg\.?\s?F\b|\(F\)/.test(text);
  const celsius = /°\s?C\b|\bdeg\.?\s?C\b|\(C\)/.test(text);
  if (fahrenheit === celsius || !(value > 0)) return null;
  return fahrenheit ? 'F' : 'C';
}
