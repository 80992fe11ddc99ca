'use client';
import { useState } from 'react';

import { BatchTag } from '@/components/ui/tag';
import { GroupRow, Table } from '@/components/ui/table';
import { PROCESS_WORDS } from '@/lib/trade/process';

import { CertificateHead } from './certificate-head';
import { CertificateWarnings } from './certificate-warnings';
import { LineRows } from './line-row';
import { ProveFoot } from './prove-foot';
import { ReadingSummary } from './reading-summary';
import { RequirementRows } from './requirement-row';
import { SignStep } from './sign-step';
import { Signatures } from './signatures';
import type { Proving } from './use-proving';

const COLUMNS = [
  { says: 'Number of the row', hidden: true, className: 'w-7' },
  { says: 'Must be proved', className: 'w-[24%]' },
  { says: 'Ordered', className: 'w-[21%]' },
  { says: 'As stated', className: 'w-[17%]' },
  { says: 'How well', className: 'w-14 max-md:hidden' },
  { says: 'Verdict' },
  { says: 'You', right: true },
];

export function ProvePanel({ proving }: { proving: Proving }) {
  const [signing, setSigning] = useState(false);
  const { data } = proving;
  const { batch } = data;
  return (
    <div className="flex min-w-0 flex-col pt-3 lg:min-h-0 lg:scroll-pb-44 lg:overflow-y-auto">
      <div className="flex-1 px-6 pb-6 max-md:px-4">
        <div className="mb-2 flex flex-wrap items-center gap-x-3.5 gap-y-1">
          <h1 className="sr-only">Prove the certificate of {batch.number}</h1>
          <BatchTag stage={batch.stage} number={batch.number} href={`/batches/${batch.id}`} />
          <span className="font-medium">{batch.processor}</span>
          <span className="text-quiet">
            <span className="num">{batch.pieces}</span> pc, {PROCESS_WORDS[batch.process]},{' '}
            {[batch.specification, batch.specificationRevision, batch.classType].filter(Boolean).join(' ')}
          </span>
        </div>
        <CertificateWarnings proving={proving} />
        <ReadingSummary proving={proving} />
        <CertificateHead proving={proving} />
        <Table label="What must be proved" columns={COLUMNS} dense>
          <Rows proving={proving} />
        </Table>
        <Signatures proving={proving} />
      </div>
      {signing ? (
        <SignStep proving={proving} onBack={() => setSigning(false)} onSigned={() => setSigning(false)} />
      ) : (
        <ProveFoot proving={proving} onSign={() => setSigning(true)} />
      )}
    </div>
  );
}

function Rows({ proving }: { proving: Proving }) {
  const { requirements, lines } = proving.data;
  const ofBatch = requirements.filter((one) => one.lineId === null);
  const withOwn = lines.filter((line) => requirements.some((one) => one.lineId === line.id));
  return (
    <>
      {ofBatch.length > 0 && (
        <>
          <GroupRow says="Whole batch" span={COLUMNS.length} />
          <RequirementRows requirements={ofBatch} proving={proving} />
        </>
      )}
      {withOwn.map((line) => (
        <Group key={line.id} says={`Line ${line.lineNo}, ${line.partNumber} rev ${line.partRevision}`}>
          <RequirementRows
            requirements={requirements.filter((one) => one.lineId === line.id)}
            proving={proving}
          />
        </Group>
      ))}
      <GroupRow says="Lines and pieces" span={COLUMNS.length} />
      <LineRows proving={proving} />
    </>
  );
}

function Group({ says, children }: { says: string; children: React.ReactNode }) {
  return (
    <>
      <GroupRow says={says} span={COLUMNS.length} />
      {children}
    </>
  );
}
