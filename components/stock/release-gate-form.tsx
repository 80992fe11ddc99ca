'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { FormProvider, useForm, useWatch } from 'react-hook-form';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Caution } from '@/components/ui/edge';
import { Dialog } from '@/components/ui/dialog';
import { SelectField } from '@/components/ui/field';
import type { ApiError } from '@/lib/api/client';
import type { InputOf, OutputOf } from '@/lib/api/endpoint';
import { listAssemblies } from '@/lib/assemblies/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { getGate, listReleases, listStock, releasePieces } from '@/lib/stock/contract';

import { AddPlace } from './add-place';
import { listWords } from './missing-words';
import type { Released } from './release-done';
import {
  allThatMay,
  atFormLine,
  chosenOf,
  ReleaseForm as Schema,
  releaseOf,
  releaseWords,
  type ReleaseFormIn,
  type ReleaseFormOut,
} from './release-form';
import { ReleaseLine } from './release-line';

type Gate = OutputOf<typeof getGate>;

interface ReleaseFormProps {
  gate: Gate;
  mayRelease: boolean;
  onReleased: (released: Released) => void;
}

export function ReleaseForm({ gate, mayRelease, onReleased }: ReleaseFormProps) {
  const { batchId, lines, locations } = gate;
  const form = useForm<ReleaseFormIn, unknown, ReleaseFormOut>({
    resolver: zodResolver(Schema),
    defaultValues: allThatMay(lines),
  });
  const chosen = chosenOf({ lines: useWatch({ control: form.control, name: 'lines' }) });
  const [asked, setAsked] = useState<InputOf<typeof releasePieces> | null>(null);
  const write = useWrite(releasePieces, { refreshes: [getGate, listReleases, listStock, listAssemblies] });
  const pieces = chosen.toStock + chosen.goingOn;
  const open = lines.filter((line) => line.mayPass > 0);
  const { root } = form.formState.errors;

  const release = async () => {
    if (!asked) return;
    try {
      const done = await write.mutateAsync(asked);
      onReleased({
        moved: movedWords(asked, gate),
        releaseIds: done.releases.map((one) => one.id),
        assemblies: done.assemblies,
      });
    } catch (error) {
      refuse(error as ApiError, asked);
    }
    setAsked(null);
  };
  const refuse = ({ problem }: ApiError, sent: InputOf<typeof releasePieces>) => {
    const fields = (problem.fields ?? []).map((one) => atFormLine(one, sent, form.getValues()));
    fields.forEach(({ field, message }, at) =>
      form.setError(field as 'lines.0.pieces', { type: 'server', message }, { shouldFocus: at === 0 }),
    );
    form.setError('root', { type: 'server', message: problem.title });
  };

  return (
    <FormProvider {...form}>
      <form
        noValidate
        aria-label={`Release ${gate.number}`}
        onSubmit={form.handleSubmit((values) => setAsked(releaseOf(batchId, values)))}
      >
        {mayRelease && open.some((line) => line.nextProcess === null) && (
          <PlaceForAll gate={gate} onChoose={(id) => chooseForAll(form, id)} />
        )}
        {lines.map((line, at) => (
          <ReleaseLine
            key={line.lineId}
            line={line}
            at={at}
            batch={gate}
            locations={locations}
            mayRelease={mayRelease}
          />
        ))}
        {mayRelease && open.length > 0 && (
          <div className="sticky bottom-0 z-10 flex flex-wrap items-center gap-x-6 gap-y-2 border-t-heavy border-ink bg-paper py-3 max-md:bottom-[60px]">
            <Button
              look="primary"
              size="big"
              type="submit"
              notNow={pieces === 0 && 'Choose at least one piece.'}
            >
              {releaseWords(chosen)}
            </Button>
            {root && (
              <p role="alert" className="font-medium text-held-ink">
                {root.message}
              </p>
            )}
          </div>
        )}
      </form>
      {!mayRelease && <p className="border-t border-rule py-3 text-quiet">Inspectors and leads release.</p>}
      <Dialog
        open={asked !== null}
        onClose={() => setAsked(null)}
        busy={write.isPending}
        title={releaseWords(chosen)}
        lead={`Your name stands on the release of ${gate.number}.`}
        onSubmit={release}
        actions={
          <>
            <Button look="primary" type="submit" busy={write.isPending} busyLabel="Releasing">
              {releaseWords(chosen)}
            </Button>
            <Button onClick={() => setAsked(null)}>Leave them in quarantine</Button>
          </>
        }
      >
        <ul aria-label="What is released">
          {asked &&
            movedWords(asked, gate).map((says) => (
              <li key={says} className="border-b border-rule py-1.5">
                {says}
              </li>
            ))}
        </ul>
        <Caution>
          The drawing, the order and the governing specification come first. The gate counts papers; it has
          not seen the pieces.
        </Caution>
      </Dialog>
    </FormProvider>
  );
}

/** One choice for all lines, where there is more than one; and a place that has no name yet. */
function PlaceForAll({ gate, onChoose }: { gate: Gate; onChoose: (locationId: string) => void }) {
  const several = gate.lines.filter((line) => line.mayPass > 0 && line.nextProcess === null).length > 1;
  const open = gate.locations.filter((place) => !place.closed);
  return (
    <div className="flex flex-wrap items-end gap-x-6 gap-y-2 pb-3">
      {several && (
        <SelectField
          label="Put all in"
          className="w-56"
          empty="A place for all lines"
          value=""
          onChange={(event) => onChoose(event.currentTarget.value)}
          options={open.map(({ id, name }) => ({ value: id, says: name }))}
        />
      )}
      <div className="pb-2">
        <AddPlace refreshes={[getGate]} onAdded={(place) => onChoose(place.id)} />
      </div>
    </div>
  );
}

function chooseForAll(
  form: ReturnType<typeof useForm<ReleaseFormIn, unknown, ReleaseFormOut>>,
  locationId: string,
): void {
  // The select can only show a place that the gate has been read with again.
  setTimeout(() =>
    form
      .getValues()
      .lines.forEach(
        (line, at) =>
          line.goesOn || form.setValue(`lines.${at}.locationId`, locationId, { shouldValidate: true }),
      ),
  );
}

/** `25 of L-0219 to C-14`, `15 of L-0233 on to anodize`. */
function movedWords(asked: InputOf<typeof releasePieces>, gate: Gate): string[] {
  return asked.lines.map(({ lineId, pieces, locationId, pieceIds = [] }) => {
    const line = gate.lines.find((one) => one.lineId === lineId);
    const place = gate.locations.find((one) => one.id === locationId)?.name;
    const to = line?.nextProcess ? `on to ${PROCESS_WORDS[line.nextProcess]}` : `to ${place ?? 'stock'}`;
    const names =
      line?.named.filter((piece) => pieceIds.includes(piece.id)).map((piece) => piece.serial) ?? [];
    return `${pieces} of ${line?.lotNumber ?? 'the lot'}${names.length > 0 ? ` (${listWords(names)})` : ''}, ${line?.partNumber ?? ''} ${line?.partName ?? ''}, ${to}`;
  });
}
