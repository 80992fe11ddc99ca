'use client';
import { useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { searchNumbers } from '@/lib/search/contract';

import { TakeUp } from './take-up';

/** Which batch it is for, then its file. */
export function TakeUpScreen() {
  const [typed, setTyped] = useState('');
  const [batch, setBatch] = useState<{ id: string; number: string }>();
  const text = typed.trim();
  const { data } = useLazyRead(searchNumbers, { text }, { enabled: text.length >= 2 && !batch });
  const hits = (data?.hits ?? []).filter((hit) => hit.kind === 'Batch' || hit.kind === 'Order');
  return (
    <>
      <PageHead
        title="Take up an invoice"
        sub="One that came on paper or by mail. What comes through the processor’s page is here already."
      />
      <div className="max-w-xl border-t-heavy border-ink pt-3">
        {batch ? (
          <p>
            For batch <strong className="num">{batch.number}</strong>.{' '}
            <Button look="word" onClick={() => setBatch(undefined)}>
              Another batch
            </Button>
          </p>
        ) : (
          <TextField
            label="Order or batch it names"
            mono
            autoFocus
            value={typed}
            onChange={(event) => setTyped(event.currentTarget.value)}
            hint={
              text.length >= 2 && data && hits.length === 0
                ? `No order or batch begins with ${text}.`
                : 'as printed on the invoice'
            }
          />
        )}
        {!batch && hits.length > 0 && (
          <ul aria-label="Batches found" className="pt-1">
            {hits.map((hit) => (
              <li key={`${hit.kind} ${hit.number}`} className="border-b border-rule py-2">
                <Button
                  look="word"
                  onClick={() => setBatch({ id: hit.href.split('/').at(-1) ?? '', number: hit.number })}
                >
                  {hit.number}
                </Button>{' '}
                <span className="text-quiet">
                  {hit.kind.toLowerCase()}, {hit.says}
                </span>
              </li>
            ))}
          </ul>
        )}
        {batch && <TakeUp key={batch.id} batchId={batch.id} />}
      </div>
    </>
  );
}
