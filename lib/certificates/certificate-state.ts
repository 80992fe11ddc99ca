import { sql } from 'drizzle-orm';

import { certificates } from '@/db/schema/evidence';

import type { CertificateState } from './contract';

/** A signature outranks being set aside, which is refused once it exists. */
export const certificateState = sql<CertificateState>`case when exists (select 1 from signatures s where s.certificate_id = ${certificates.id}) then 'signed' when ${certificates.setAsideAt} is not null then 'set_aside' else 'waiting' end`;
