'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { CertificatesSection } from '@/components/certificates/certificates-section';
import { BatchMessages } from '@/components/messages/batch-messages';
import { InvoicesSection } from '@/components/invoices/invoices-section';
import { NonconformancesSection } from '@/components/nonconformances/nonconformances-section';
import { useMay } from '@/components/session/use-me';
import { ReceiptsSection } from '@/components/receipts/receipts-section';
import { ReleaseSection } from '@/components/stock/release-section';
import { MainAndSide } from '@/components/ui/section';
import { getBatch } from '@/lib/batches/contract';

import { BatchHead, HowItStands } from './batch-head';
import { ChecksSection } from './checks-section';
import { LinesSection } from './lines-section';
import { LinkSection } from './link-section';
import { LoadPlanSection } from './load-plan-section';
import { PriceSection } from './price-section';
import { RequirementsSection } from './requirements-section';
import { RideAlongSection } from './ride-along-section';
import { TermsSection } from './terms-section';
import { TravellerSection } from './traveller-section';

/** One batch: while it is here, what it takes to send it; once it left, how it comes back. Each section reads for itself. */
export function BatchScreen({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const isHere = batch.dispatchedAt === null;
  return (
    <>
      <BatchHead batchId={batchId} />
      {isHere ? (
        <Building batchId={batchId} isOpen={batch.cancelledAt === null} />
      ) : (
        <Sent batchId={batchId} isCancelled={batch.cancelledAt !== null} />
      )}
    </>
  );
}

function Building({ batchId, isOpen }: { batchId: string; isOpen: boolean }) {
  return (
    <MainAndSide
      main={
        <>
          <LinesSection batchId={batchId} />
          {isOpen && <LoadPlanSection batchId={batchId} />}
        </>
      }
      side={
        <>
          {isOpen && <ChecksSection batchId={batchId} />}
          <PriceSection batchId={batchId} />
          <TravellerSection batchId={batchId} />
        </>
      }
      foot={
        <>
          <RequirementsSection batchId={batchId} />
          {isOpen && <TermsSection batchId={batchId} />}
          {isOpen && <RideAlongSection batchId={batchId} />}
          <History entity="batch" id={batchId} title="What was done" />
        </>
      }
    />
  );
}

function Sent({ batchId, isCancelled }: { batchId: string; isCancelled: boolean }) {
  const mayWrite = useMay('batch.message');
  const [now] = useState(() => new Date().toISOString());
  return (
    <MainAndSide
      main={
        <>
          <HowItStands batchId={batchId} />
          <LinesSection batchId={batchId} />
          <BatchMessages batchId={batchId} now={now} mayWrite={mayWrite} />
          {!isCancelled && <ReceiptsSection batchId={batchId} />}
          <CertificatesSection batchId={batchId} dispatched />
          {!isCancelled && <NonconformancesSection batchId={batchId} dispatched />}
          <InvoicesSection batchId={batchId} dispatched />
          {!isCancelled && <ReleaseSection batchId={batchId} />}
        </>
      }
      side={
        <>
          <TravellerSection batchId={batchId} />
          <LinkSection batchId={batchId} />
          <PriceSection batchId={batchId} />
        </>
      }
      foot={
        <>
          <RequirementsSection batchId={batchId} />
          <History entity="batch" id={batchId} title="What was done" />
        </>
      }
    />
  );
}
