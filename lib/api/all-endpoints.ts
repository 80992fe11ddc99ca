import * as assemblies from '@/lib/assemblies/endpoints';
import * as audit from '@/lib/audit/endpoints';
import * as batches from '@/lib/batches/endpoints';
import * as certificates from '@/lib/certificates/endpoints';
import * as charts from '@/lib/charts/endpoints';
import * as dossiers from '@/lib/dossiers/endpoints';
import * as equipment from '@/lib/equipment/endpoints';
import * as files from '@/lib/files/endpoints';
import * as invoices from '@/lib/invoices/endpoints';
import * as jobs from '@/lib/jobs/endpoints';
import * as lots from '@/lib/lots/endpoints';
import * as messages from '@/lib/messages/endpoints';
import * as nonconformances from '@/lib/nonconformances/endpoints';
import * as organisations from '@/lib/organisations/endpoints';
import * as parts from '@/lib/parts/endpoints';
import * as payments from '@/lib/payments/endpoints';
import * as people from '@/lib/people/endpoints';
import * as portal from '@/lib/portal/endpoints';
import * as batchLinks from '@/lib/portal/link-endpoints';
import * as processors from '@/lib/processors/endpoints';
import * as readings from '@/lib/readings/endpoints';
import * as receipts from '@/lib/receipts/endpoints';
import * as reference from '@/lib/reference/endpoints';
import * as requirements from '@/lib/requirements/endpoints';
import * as search from '@/lib/search/endpoints';
import * as session from '@/lib/session/endpoints';
import * as stock from '@/lib/stock/endpoints';
import * as tideline from '@/lib/tideline/endpoints';

import type { Endpoint } from './endpoint';

/** Every read and write there is: what the documentation and the walk over all permissions go by. */
export const ALL_ENDPOINTS: readonly Endpoint[] = [
  assemblies,
  audit,
  batchLinks,
  batches,
  certificates,
  charts,
  dossiers,
  equipment,
  files,
  invoices,
  jobs,
  lots,
  messages,
  nonconformances,
  organisations,
  parts,
  payments,
  people,
  portal,
  processors,
  readings,
  receipts,
  reference,
  requirements,
  search,
  session,
  stock,
  tideline,
].flatMap((domain) => Object.values(domain) as unknown as Endpoint[]);
