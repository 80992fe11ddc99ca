import type { Metadata } from 'next';

import { readOnServer } from '@/app/_kit/prefetch';
import { LabelSheet } from '@/components/stock/label-sheet';
import { env } from '@/lib/env';
import { qrPath } from '@/lib/pdf/qr-path';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { listReleasesEndpoint } from '@/lib/stock/endpoints';

import '@/app/label.css';

export const metadata: Metadata = { title: 'Labels' };

interface LabelsPageProps {
  params: Promise<{ id: string }>;
  searchParams: Promise<{ of?: string | string[] }>;
}

export default async function LabelsPage({ params, searchParams }: LabelsPageProps) {
  const { id } = await params;
  const { of } = await searchParams;
  const { organisation } = await readOnServer(getMeEndpoint, {});
  const { rows } = await readOnServer(listReleasesEndpoint, { batchId: id });
  const wanted = typeof of === 'string' && of !== '' ? of.split(',') : null;
  const labels = rows
    .filter((row) => wanted === null || wanted.includes(row.id))
    .map((release) => ({ release, code: qrPath(`${env.APP_URL}/lots/${release.lotId}`) }));
  return (
    <LabelSheet
      batchId={id}
      ofAll={rows.length}
      labels={labels}
      shop={organisation.name}
      clock={{ zone: organisation.zone, now: new Date() }}
    />
  );
}
