'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow, MetChecks } from '@/components/ui/check-row';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { getBatchChecks, withdrawOverride, type BatchFinding } from '@/lib/batches/check-contract';
import { getBatch, putBatchAside, removeLine, type Batch } from '@/lib/batches/contract';
import { momentWords } from '@/lib/day-words';

import { OverrideDialog } from './override-dialog';
import { useBatchWrite } from './use-batch-write';

/** What stands in the way of leaving, each with its ways out. */
export function ChecksSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchChecks, { batchId });
  const [overriding, setOverriding] = useState<BatchFinding | null>(null);
  const count = (level: BatchFinding['level']) =>
    data.findings.filter((finding) => finding.level === level && finding.passed === null).length;
  return (
    <Section
      title="Before it leaves"
      action={<Counts stops={count('stop')} warns={count('warn')} notes={count('note')} />}
    >
      {data.findings.length > 0 && (
        <CheckList label="Before it leaves">
          {data.findings.map((finding) => (
            <CheckRow
              key={finding.code + finding.subject}
              level={finding.passed ? 'note' : finding.level}
              sentence={finding.sentence}
              rest={finding.rest}
              source={finding.source}
              waysOut={
                finding.passed ? (
                  <Passed batch={batch} finding={finding} />
                ) : (
                  <WaysOut batch={batch} finding={finding} override={() => setOverriding(finding)} />
                )
              }
            />
          ))}
        </CheckList>
      )}
      {data.met.length > 0 && (
        <MetChecks count={data.met.length} alone={data.findings.length === 0}>
          <ul className="text-quiet">
            {data.met.map((met) => (
              <li key={met}>{met}</li>
            ))}
          </ul>
        </MetChecks>
      )}
      <OverrideDialog batch={batch} finding={overriding} onClose={() => setOverriding(null)} />
    </Section>
  );
}

function Counts({ stops, warns, notes }: { stops: number; warns: number; notes: number }) {
  return (
    <span className="text-second">
      {stops > 0 ? (
        <strong className="text-held-ink">{`${stops} ${stops === 1 ? 'stops' : 'stop'} it`}</strong>
      ) : (
        'nothing stops it'
      )}
      {warns > 0 && (
        <>
          , <strong className="text-dispatched-ink">{`${warns} ${warns === 1 ? 'warns' : 'warn'}`}</strong>
        </>
      )}
      {notes > 0 && `, ${notes} ${notes === 1 ? 'note' : 'notes'}`}
    </span>
  );
}

/** Where on the page the matter is settled. */
const ANCHORS: Partial<Record<BatchFinding['waysOut'][number]['way'], string>> = {
  add_lot: '#ride-along',
  set_days: '#terms',
  set_prices: '#lines',
  set_requirements: '#requirements',
  set_loads: '#load-plan',
  choose_processor: '#terms',
};

function WaysOut({
  batch,
  finding,
  override,
}: {
  batch: Batch;
  finding: BatchFinding;
  override: () => void;
}) {
  const [mayBuild, mayOverride] = [useMay('batch.build'), useMay('batch.override')];
  const takeOut = useBatchWrite(removeLine);
  const aside = useBatchWrite(putBatchAside);
  if (!mayBuild) return null;
  const seen = { batchId: batch.id, version: batch.version };
  return finding.waysOut.map(({ way, says, lineId, partId }) => {
    const anchor = ANCHORS[way];
    if (anchor) {
      return (
        <a key={way} href={anchor} className="lw-word-button">
          {says}
        </a>
      );
    }
    if (way === 'see_processor')
      return (
        <Link key={way} href={`/processors/${batch.processorId}`} className="lw-word-button">
          {says}
        </Link>
      );
    if (way === 'state_order' && partId)
      return (
        <Link key={way} href={`/parts/${partId}/edit`} className="lw-word-button">
          {says}
        </Link>
      );
    if (way === 'take_out_line' && lineId) {
      return (
        <Button
          key={way}
          look="word"
          onClick={async () =>
            void (
              (await takeOut.run({ ...seen, lineId })) &&
              showMessage({ says: 'The line is out. Its pieces wait for the step again.' })
            )
          }
        >
          {says}
        </Button>
      );
    }
    if (way === 'take_up')
      return (
        <Button key={way} look="word" onClick={() => aside.run({ ...seen, aside: false })}>
          {says}
        </Button>
      );
    if (way !== 'override') return null;
    if (!mayOverride)
      return (
        <span key={way} className="text-quiet">
          An admin can let it pass.
        </span>
      );
    return (
      <Button key={way} look="word" onClick={override}>
        {says}
      </Button>
    );
  });
}

function Passed({ batch, finding }: { batch: Batch; finding: BatchFinding }) {
  const clock = useClock();
  const mayOverride = useMay('batch.override');
  const withdraw = useBatchWrite(withdrawOverride);
  const { passed } = finding;
  if (!passed) return null;
  return (
    <>
      <span className="text-second">
        Let pass by {passed.by}, {momentWords(new Date(passed.at), clock)}: {passed.reason}
      </span>
      {mayOverride && (
        <Button
          look="word"
          onClick={() =>
            withdraw.run({ batchId: batch.id, version: batch.version, overrideId: passed.overrideId })
          }
        >
          Take that back
        </Button>
      )}
    </>
  );
}
