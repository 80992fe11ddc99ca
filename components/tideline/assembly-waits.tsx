import Link from 'next/link';

import { StageMark } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';
import { STAGE_TONES, STAGE_WORDS } from '@/components/ui/stages';
import { SteelRule } from '@/components/ui/steel-rule';
import { Cell, Row, Table } from '@/components/ui/table';
import { shortDayWords } from '@/lib/day-words';
import type { AssemblyWait, Tideline } from '@/lib/tideline/contract';

const MOST_BATCHES = 3;

/** Need day, pieces ready of pieces needed on a rule, and the batches that hold the rest. */
export function AssemblyWaits({ tideline }: { tideline: Tideline }) {
  const { assemblies } = tideline;
  return (
    <Section
      title="What each assembly waits for"
      action={
        assemblies.length > 0 ? (
          <span className="text-second text-quiet">pieces ready of pieces needed</span>
        ) : undefined
      }
    >
      {assemblies.length === 0 ? (
        <p className="py-3 text-quiet">
          No assembly is open. Enter one with the parts it needs, and this list says what it waits for.{' '}
          <Link href="/assemblies">Assemblies</Link>
        </p>
      ) : (
        <Table
          keep
          label="What each assembly waits for"
          columns={['Assembly', 'Needed', 'Ready', 'Pieces', 'Batches'].map((says) => ({
            says,
            hidden: true,
          }))}
        >
          {assemblies.map((assembly) => (
            <AssemblyRow key={assembly.id} assembly={assembly} tideline={tideline} />
          ))}
        </Table>
      )}
    </Section>
  );
}

function AssemblyRow({ assembly, tideline }: { assembly: AssemblyWait; tideline: Tideline }) {
  const isLate = assembly.neededOn !== null && assembly.neededOn < tideline.today;
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  const tick = Math.max(1, Math.ceil(assembly.needed / 10));
  return (
    <Row>
      <Cell>
        <Link
          href={`/assemblies/${assembly.id}`}
          className="text-tag font-cond font-semibold no-underline hover:underline md:whitespace-nowrap"
        >
          {assembly.name}
        </Link>
      </Cell>
      <Cell figure>
        {assembly.neededOn && (
          <span className={isLate ? 'font-semibold text-held-ink' : ''}>
            {shortDayWords(assembly.neededOn, clock)}
          </span>
        )}
      </Cell>
      <Cell>
        <SteelRule
          small
          to={Math.max(assembly.needed, 1)}
          tick={tick}
          number={tick * 5}
          value={assembly.ready}
          width={104}
          says={`${assembly.ready} of ${assembly.needed} pieces ready`}
        />
      </Cell>
      <Cell figure right>
        {assembly.ready}/{assembly.needed}
      </Cell>
      <Cell>
        <span className="flex flex-wrap gap-x-3">
          {assembly.batches.slice(0, MOST_BATCHES).map((batch) => (
            <Link
              key={batch.id}
              href={`/batches/${batch.id}`}
              className={`inline-flex min-h-6 items-center gap-1 text-(--ti) no-underline ${STAGE_TONES[batch.stage]}`}
              aria-label={`${batch.number}, ${STAGE_WORDS[batch.stage]}, ${batch.pieces} pieces`}
            >
              <StageMark stage={batch.stage} size={12} />
              <span className="num font-semibold">{batch.number.replace(/^B-/, '')}</span>
            </Link>
          ))}
          {assembly.batches.length > MOST_BATCHES && (
            <span className="text-quiet">and {assembly.batches.length - MOST_BATCHES} more</span>
          )}
        </span>
      </Cell>
    </Row>
  );
}
