'use client';
import type { ReactNode } from 'react';

import { PrintButton } from '@/components/stock/print-button';
import { SegmentButtons } from '@/components/ui/segments';
import { Section } from '@/components/ui/section';

import type { BenchUnits } from './bench-units';

const UNITS = [
  { value: 'inch', says: 'inch, °F' },
  { value: 'metric', says: 'mm, °C' },
] as const;

interface CalculatorFrameProps {
  title: string;
  note?: string;
  units: BenchUnits;
  onUnits: (units: BenchUnits) => void;
  children: ReactNode;
}

/** One calculator: its fields, its answer, its drawing, its sources. */
export function CalculatorFrame({ title, note, units, onUnits, children }: CalculatorFrameProps) {
  return (
    <>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 pb-4 print:hidden">
        <span className="text-second text-quiet">Units</span>
        <SegmentButtons label="Units" value={units} options={UNITS} onChange={onUnits} />
        <PrintButton says="Print this page" look="outlined" />
      </div>
      <Section title={title} note={note}>
        {children}
      </Section>
    </>
  );
}

/** The fields of a calculator, as wide as what goes into them. */
export function BenchFieldRow({ children, label }: { children: ReactNode; label: string }) {
  return (
    <div
      role="group"
      aria-label={label}
      className="grid grid-cols-2 items-start gap-x-3.5 gap-y-3 pt-2.5 sm:flex sm:flex-wrap [&>*]:sm:w-32 [&>.wide]:sm:w-52 [&>.wider]:sm:w-80"
    >
      {children}
    </div>
  );
}
