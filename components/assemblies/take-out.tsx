'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import Link from 'next/link';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Refusal, SpotPieces } from '@/components/stock/spot-fields';
import { SpotForm, typedCount, type SpotFormIn, type SpotFormOut } from '@/components/stock/spot-form';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import type { ApiError } from '@/lib/api/client';
import { getAssembly, listAssemblies, type AssemblyNeedRow } from '@/lib/assemblies/contract';
import { fitPieces, getStockSpot, listLocations, listStock, takeOutPieces } from '@/lib/stock/contract';

const REFRESHES = [getAssembly, listAssemblies, listStock, getStockSpot, listLocations];

interface TakeOutProps {
  lot: AssemblyNeedRow['fittedLots'][number];
  assembly: { id: string; name: string };
  may: boolean;
}

/** A lot that went into the assembly, with the way to its evidence; and back to the stores, where it was fitted by mistake. */
export function TakeOut({ lot, assembly, may }: TakeOutProps) {
  const [open, setOpen] = useState(false);
  return (
    <div className="border-b border-rule py-2">
      <p className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <span>
          <span className="num">{lot.pieces}</span> of{' '}
          <Link href={`/lots/${lot.lotId}`} className="num font-semibold">
            {lot.lotNumber}
          </Link>
          {lot.named.length > 0 && (
            <span className="num text-quiet"> {lot.named.map((piece) => piece.serial).join(' ')}</span>
          )}
        </span>
        <span className="ml-auto flex gap-4">
          <Link href={`/lots/${lot.lotId}/dossier`} className="lw-word-button">
            Dossier
          </Link>
          {may && (
            <Button look="word" aria-expanded={open} onClick={() => setOpen(!open)}>
              {open ? 'Leave it in' : 'Take out'}
              <span className="sr-only"> {lot.lotNumber}</span>
            </Button>
          )}
        </span>
      </p>
      {open && <TakeOutForm lot={lot} assembly={assembly} onDone={() => setOpen(false)} />}
    </div>
  );
}

function TakeOutForm({ lot, assembly, onDone }: Omit<TakeOutProps, 'may'> & { onDone: () => void }) {
  const { data } = useLazyRead(listLocations, {});
  const places = (data?.rows ?? []).filter((place) => !place.closed);
  const form = useForm<SpotFormIn, unknown, SpotFormOut>({
    resolver: zodResolver(SpotForm),
    defaultValues: { isNamed: lot.named.length > 0, pieces: String(lot.pieces), names: [], to: '' },
  });
  const write = useWrite(takeOutPieces, { refreshes: REFRESHES });
  const fit = useWrite(fitPieces, { refreshes: REFRESHES });
  const typed = useWatch({ control: form.control });
  const count = typedCount({
    isNamed: typed.isNamed ?? false,
    pieces: typed.pieces ?? '',
    names: typed.names ?? [],
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit(async ({ to, ...rest }) => {
    if (to === '') return form.setError('to', { type: 'local', message: 'Choose the place they go to.' });
    const moved = { lotId: lot.lotId, assemblyId: assembly.id, locationId: to, ...rest };
    const done = await write
      .mutateAsync(moved, {
        onError: ({ problem }) =>
          form.setError('root', { type: 'server', message: problem.fields?.[0]?.message ?? problem.title }),
      })
      .catch(() => null);
    if (!done) return;
    const undo = () =>
      fit.mutateAsync(moved).then(
        () => showMessage({ says: `${rest.pieces} of ${lot.lotNumber} are back in ${assembly.name}.` }),
        (error: ApiError) => showMessage({ says: error.message, failed: true }),
      );
    showMessage({
      says: `${rest.pieces} of ${lot.lotNumber} taken out of ${assembly.name}.`,
      action: { says: 'Undo', run: undo },
    });
    onDone();
  });
  return (
    <form noValidate onSubmit={submit} aria-label={`Take ${lot.lotNumber} out`} className="pt-2">
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
        <SpotPieces form={form} label="Pieces to take out" max={lot.pieces} named={lot.named} />
        <SelectField
          label="To the place"
          className="min-w-44 flex-1"
          empty="Choose a place"
          error={errors.to?.message}
          options={places.map(({ id, name }) => ({ value: id, says: name }))}
          {...form.register('to')}
        />
      </div>
      <div className="pt-3">
        <Button type="submit" busy={write.isPending} busyLabel="Taking out">
          Take out {count ?? ''}
        </Button>
      </div>
      <Refusal says={errors.root?.message} />
    </form>
  );
}
