'use client';

import Link from 'next/link';

import { Edge } from '@/components/ui/edge';
import { materialOf, temperOf } from '@/lib/parts/material-of';
import { HOLDING_LIMITS } from '@/lib/trade/tables/holding-limits';
import { isAsQuenched } from '@/lib/trade/tempers/temper';

import { spanWords } from './bench-moment';
import { SourceLine } from './source-line';
import { useTables } from './use-tables';

interface AsQuenchedNoteProps {
  /** As the part says it. */
  alloy: string;
  /** What the step makes; null where it says none. */
  condition: string | null;
}

/** Of pieces that come back quenched and not aged: how long they keep soft, and the way to the clock. Else nothing. */
export function AsQuenchedNote({ alloy, condition }: AsQuenchedNoteProps) {
  const { material } = useTables();
  const temper = condition === null ? undefined : temperOf(material.tempers, condition);
  if (!temper || !isAsQuenched(temper)) return null;
  const read = materialOf(material, { alloy, form: '', clad: false });
  const row =
    read.known === 'yes'
      ? HOLDING_LIMITS.rows.find(({ alloys }) => alloys.includes(read.material.alloy))
      : undefined;
  return (
    <Edge level="warn">
      It comes back as quenched and ages from then on.{' '}
      {row && read.known === 'yes' ? (
        <>
          {read.material.alloy} keeps soft {spanWords(row.roomMin)} at room temperature, longer in the cold.{' '}
          <Link href={`/reference/holding?alloy=${read.material.alloy}`}>As-quenched clock</Link>
          <SourceLine source={row.source} />
        </>
      ) : (
        'No table here says how long this alloy keeps soft.'
      )}
    </Edge>
  );
}
