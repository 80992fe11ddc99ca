'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import type { ApiError } from '@/lib/api/client';
import { getStockSpot, listLocations, listStock, moveStock, type StockSpot } from '@/lib/stock/contract';

import { AddPlace } from './add-place';
import { Refusal, SpotPieces } from './spot-fields';
import { SpotForm, typedCount, type SpotFormIn, type SpotFormOut } from './spot-form';

interface MoveFormProps {
  lotId: string;
  lotNumber: string;
  locationId: string;
  location: string;
  spot: StockSpot;
}

const REFRESHES = [listStock, getStockSpot, listLocations];

/** Moves pieces to another place of the stores. */
export function MoveForm({ lotId, lotNumber, locationId, location, spot }: MoveFormProps) {
  const { data } = useLazyRead(listLocations, {});
  const places = (data?.rows ?? []).filter((place) => place.id !== locationId && !place.closed);
  const form = useForm<SpotFormIn, unknown, SpotFormOut>({
    resolver: zodResolver(SpotForm),
    defaultValues: {
      isNamed: spot.named.length > 0,
      pieces: String(spot.pieces),
      names: spot.named.map((piece) => piece.id),
      to: '',
    },
  });
  const move = useWrite(moveStock, { refreshes: REFRESHES });
  const typed = useWatch({ control: form.control });
  const count = typedCount({
    isNamed: typed.isNamed ?? false,
    pieces: typed.pieces ?? '',
    names: typed.names ?? [],
  });
  const to = places.find((place) => place.id === typed.to);
  const { errors } = form.formState;

  const submit = form.handleSubmit(async ({ to: toLocationId, ...rest }) => {
    if (toLocationId === '')
      return form.setError('to', { type: 'local', message: 'Choose the place they go to.' });
    const moved = { lotId, fromLocationId: locationId, toLocationId, ...rest };
    const done = await move.mutateAsync(moved, { onError: (error) => refuse(error) }).catch(() => null);
    if (!done) return;
    const undo = () =>
      move.mutateAsync({ ...moved, fromLocationId: toLocationId, toLocationId: locationId }).then(
        () => showMessage({ says: `${moved.pieces} of ${lotNumber} are back in ${location}.` }),
        (error: ApiError) => showMessage({ says: error.message, failed: true }),
      );
    showMessage({
      says: `${moved.pieces} of ${lotNumber} moved to ${to?.name ?? 'the other place'}.`,
      action: { says: 'Undo', run: undo },
    });
  });
  const refuse = ({ problem }: ApiError) => {
    const { fields = [] } = problem;
    for (const { field, message } of fields)
      form.setError(field === 'toLocationId' ? 'to' : 'pieces', { type: 'server', message });
    if (fields.length === 0) form.setError('root', { type: 'server', message: problem.title });
  };

  return (
    <form noValidate onSubmit={submit} aria-label={`Move pieces of ${lotNumber}`}>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
        <SpotPieces form={form} label="Pieces to move" max={spot.pieces} named={spot.named} />
        <SelectField
          label="To the place"
          className="min-w-44 flex-1"
          empty="Choose a place"
          error={errors.to?.message}
          options={places.map(({ id, name }) => ({ value: id, says: name }))}
          {...form.register('to')}
        />
      </div>
      <div className="flex flex-wrap items-center gap-4 pt-3">
        <Button type="submit" busy={move.isPending} busyLabel="Moving">
          Move {count ?? ''}
          {to && ` to ${to.name}`}
        </Button>
        <AddPlace
          onAdded={(place) => setTimeout(() => form.setValue('to', place.id, { shouldValidate: true }))}
        />
      </div>
      <Refusal says={errors.root?.message} />
    </form>
  );
}
