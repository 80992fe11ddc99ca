'use client';
import { useEffect, useState } from 'react';

import {
  benchText,
  readBench,
  unitWord,
  type BenchKind,
  type BenchUnits,
  type MeasureKind,
} from './bench-units';

/** How long a person pauses before the address follows what was typed. */
const ADDRESS_AFTER_MS = 400;

/** Each field by its name in the address: what it measures, and what stands in it at first, in inches and °F. */
export type BenchFields = Readonly<Record<string, { kind: BenchKind; first: string }>>;
export type Given = Readonly<Record<string, string | undefined>>;

export interface Bench<Name extends string> {
  units: BenchUnits;
  setUnits: (units: BenchUnits) => void;
  typed: Readonly<Record<Name, string>>;
  /** What a field needs to be bound to its name: value, what changes it, its unit. */
  field: (name: Name) => { value: string; unit: string | undefined; onChange: (event: Changed) => void };
  /** The same for a field that is chosen from a list. */
  choice: (name: Name) => { value: string; onChange: (event: Changed) => void };
  /** The measure in mm, °C or MPa, a number as it is; null where it cannot be read. */
  read: (name: Name) => number | null;
  /** A length in mm, a temperature in °C or a stress in MPa, as it is written in the units chosen, with its unit. */
  says: (value: number, kind: MeasureKind) => string;
  set: (values: Partial<Record<Name, string>>) => void;
}
type Changed = { currentTarget: { value: string } };

/** The fields of one calculator. They stand in the address, so that what is worked out can be sent to somebody. */
export function useBench<Fields extends BenchFields>(
  fields: Fields,
  given: Given,
): Bench<keyof Fields & string> {
  type Name = keyof Fields & string;
  const names = Object.keys(fields) as Name[];
  const kindOf = (name: Name) => fields[name]?.kind ?? 'word';
  const [units, setUnits] = useState<BenchUnits>(given['units'] === 'metric' ? 'metric' : 'inch');
  const [typed, setTyped] = useState(
    () =>
      Object.fromEntries(
        names.map((name) => [name, given[name] ?? firstText(fields[name]?.first ?? '', kindOf(name), units)]),
      ) as Record<Name, string>,
  );

  useEffect(() => {
    const timer = setTimeout(() => {
      const address = new URLSearchParams({ ...typed, ...(units === 'metric' ? { units } : {}) });
      window.history.replaceState(null, '', `?${address}`);
    }, ADDRESS_AFTER_MS);
    return () => clearTimeout(timer);
  }, [typed, units]);

  const read = (name: Name) => readBench(typed[name], kindOf(name), units);
  const set = (values: Partial<Record<Name, string>>) => setTyped((was) => ({ ...was, ...values }));
  const change =
    (name: Name) =>
    ({ currentTarget }: Changed) =>
      set({ [name]: currentTarget.value } as Partial<Record<Name, string>>);
  return {
    units,
    typed,
    read,
    set,
    setUnits: (next) => {
      const again = names.map((name) => {
        const value = kindOf(name) === 'word' ? null : read(name);
        return [name, value === null ? typed[name] : benchText(value, kindOf(name), next)];
      });
      setTyped(Object.fromEntries(again) as Record<Name, string>);
      setUnits(next);
    },
    field: (name) => ({
      value: typed[name],
      unit: unitWord(kindOf(name), units),
      onChange: change(name),
    }),
    choice: (name) => ({ value: typed[name], onChange: change(name) }),
    says: (value, kind) => `${benchText(value, kind, units)} ${unitWord(kind, units) ?? ''}`,
  };
}

function firstText(first: string, kind: BenchKind, units: BenchUnits): string {
  const value = units === 'metric' ? readBench(first, kind, 'inch') : null;
  return value === null ? first : benchText(value, kind, units);
}
