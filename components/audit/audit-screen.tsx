'use client';
import { useRouter } from 'next/navigation';

import { useRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { DateField, SelectField } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { listAuditFilters } from '@/lib/audit/contract';
import { kindWords } from '@/lib/audit/words';

import { Trail } from './trail';

export interface AuditFilter {
  entity?: string;
  entityId?: string;
  personId?: string;
  from?: string;
  to?: string;
}

/** The whole trail; what is looked for stands in the address, so that it can be sent to somebody. */
export function AuditScreen({ filter }: { filter: AuditFilter }) {
  const router = useRouter();
  const { data } = useRead(listAuditFilters, {});
  const change = (part: Partial<Record<keyof AuditFilter, string>>) => {
    const next = Object.entries({ ...filter, ...part }).filter(
      ([, value]) => value !== undefined && value !== '',
    );
    router.replace(
      next.length === 0 ? '/audit' : `/audit?${new URLSearchParams(next as [string, string][]).toString()}`,
    );
  };
  const isNarrowed = Object.keys(filter).length > 0;
  return (
    <>
      <PageHead
        title="Audit trail"
        sub="Every change in this shop: who, when, from where, before and after. Entries are sealed one to the next and never change."
      />
      <div className="flex flex-wrap items-end gap-x-4 gap-y-3 border-t-heavy border-ink pt-3 pb-4">
        <SelectField
          label="Thing"
          empty="Everything"
          value={filter.entity ?? ''}
          onChange={(event) => change({ entity: event.currentTarget.value, entityId: '' })}
          options={data.entities.map((entity) => ({ value: entity, says: kindWords(entity) }))}
        />
        <SelectField
          label="Person"
          empty="Everybody"
          value={filter.personId ?? ''}
          onChange={(event) => change({ personId: event.currentTarget.value })}
          options={data.people.map(({ id, name }) => ({ value: id, says: name }))}
        />
        <DateField
          label="From"
          value={filter.from ?? ''}
          onChange={(event) => change({ from: event.currentTarget.value })}
        />
        <DateField
          label="To"
          value={filter.to ?? ''}
          onChange={(event) => change({ to: event.currentTarget.value })}
        />
        {isNarrowed && (
          <Button look="word" onClick={() => router.replace('/audit')}>
            Show everything
          </Button>
        )}
      </div>
      <Trail asked={{ ...filter, limit: 50 }} zone={data.zone} />
    </>
  );
}
