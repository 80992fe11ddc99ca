'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';

import { useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import type { ApiError } from '@/lib/api/client';
import { getAssembly, listAssemblies } from '@/lib/assemblies/contract';
import { shortDayWords } from '@/lib/day-words';
import {
  fitPieces,
  getStockSpot,
  listLocations,
  listStock,
  takeOutPieces,
  type StockSpot,
} from '@/lib/stock/contract';

import { Refusal, SpotPieces } from './spot-fields';
import { SpotForm, typedCount, type SpotFormIn, type SpotFormOut } from './spot-form';

interface FitFormProps {
  lotId: string;
  lotNumber: string;
  locationId: string;
  spot: StockSpot;
  /** On the page of an assembly: no other is offered. */
  onlyTo?: string;
}

const REFRESHES = [listStock, getStockSpot, listLocations, listAssemblies, getAssembly];

/** Issues pieces to an assembly that needs them, the one that needs them first unless another is chosen. */
export function FitForm({ lotId, lotNumber, locationId, spot, onlyTo }: FitFormProps) {
  const clock = useClock();
  const needs = onlyTo === undefined ? spot.needs : spot.needs.filter((one) => one.assemblyId === onlyTo);
  const first = needs[0];
  const most = Math.min(spot.pieces, first?.open ?? 0);
  const form = useForm<SpotFormIn, unknown, SpotFormOut>({
    resolver: zodResolver(SpotForm),
    defaultValues: {
      isNamed: spot.named.length > 0,
      pieces: String(most),
      names: spot.named.slice(0, most).map((piece) => piece.id),
      to: first?.assemblyId ?? '',
    },
  });
  const fit = useWrite(fitPieces, { refreshes: REFRESHES });
  const takeOut = useWrite(takeOutPieces, { refreshes: REFRESHES });
  const typed = useWatch({ control: form.control });
  const need = needs.find((one) => one.assemblyId === typed.to) ?? first;
  const count = typedCount({
    isNamed: typed.isNamed ?? false,
    pieces: typed.pieces ?? '',
    names: typed.names ?? [],
  });
  const { errors } = form.formState;

  const submit = form.handleSubmit(async ({ to, ...rest }) => {
    const moved = { lotId, locationId, assemblyId: to, ...rest };
    const done = await fit.mutateAsync(moved, { onError: (error) => refuse(error) }).catch(() => null);
    if (!done) return;
    const undo = () =>
      takeOut
        .mutateAsync(moved)
        .then(
          () => showMessage({ says: `${moved.pieces} of ${lotNumber} are back in their place.` }),
          failed,
        );
    showMessage({
      says: `${moved.pieces} of ${lotNumber} fitted to ${need?.name ?? 'the assembly'}.`,
      action: { says: 'Undo', run: undo },
    });
  });
  const refuse = ({ problem }: ApiError) => {
    const { fields = [] } = problem;
    for (const { field, message } of fields)
      form.setError(field === 'assemblyId' ? 'to' : 'pieces', { type: 'server', message });
    if (fields.length === 0) form.setError('root', { type: 'server', message: problem.title });
  };

  if (!first)
    return (
      <p className="text-quiet">
        {onlyTo === undefined ? 'No open assembly needs more of this part.' : 'No more of it is needed here.'}
      </p>
    );
  return (
    <form noValidate onSubmit={submit} aria-label={`Fit pieces of ${lotNumber}`}>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
        <SpotPieces
          form={form}
          label="Pieces to fit"
          max={Math.min(spot.pieces, need?.open ?? spot.pieces)}
          named={spot.named}
        />
        {onlyTo === undefined && (
          <SelectField
            label="To the assembly"
            className="min-w-56 flex-1"
            error={errors.to?.message}
            options={needs.map(({ assemblyId, name, open, neededOn }) => ({
              value: assemblyId,
              says: `${name}, needs ${open} more${neededOn === null ? '' : `, ${shortDayWords(neededOn, clock)}`}`,
            }))}
            {...form.register('to')}
          />
        )}
      </div>
      <div className="pt-3">
        <Button type="submit" busy={fit.isPending} busyLabel="Fitting">
          Fit {count ?? ''} to {need?.name}
        </Button>
      </div>
      <Refusal says={errors.root?.message} />
    </form>
  );
}

const failed = (error: ApiError) => showMessage({ says: error.message, failed: true });
