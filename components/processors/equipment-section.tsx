'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { addEquipment, listEquipment, retireEquipment, type Equipment } from '@/lib/equipment/contract';

import { EquipmentForm } from './equipment-form';

/** Furnaces, ovens and tanks: parts and loads are checked against them before a batch leaves. */
export function EquipmentSection({ processorId, mayEdit }: { processorId: string; mayEdit: boolean }) {
  const { data } = useRead(listEquipment, { processorId });
  const [openId, setOpen] = useState<string | null>(null);
  const opened = data.equipment.find(({ id }) => id === openId) ?? null;
  return (
    <Section
      id="equipment"
      title="Equipment"
      note="room inside, edge to edge"
      action={
        mayEdit &&
        openId === null && (
          <Button look="word" onClick={() => setOpen(NEW)}>
            Add equipment
          </Button>
        )
      }
    >
      {openId !== null && (
        <EquipmentForm key={openId} processorId={processorId} of={opened} done={() => setOpen(null)} />
      )}
      {data.equipment.length === 0 ? (
        <Empty
          says="No furnace, oven or tank is entered."
          comes="Once one is, parts that are too large for it are found before they leave."
        />
      ) : (
        <EquipmentTable
          equipment={data.equipment}
          actions={
            mayEdit
              ? (one) => <EquipmentActions processorId={processorId} of={one} open={() => setOpen(one.id)} />
              : null
          }
        />
      )}
    </Section>
  );
}

const NEW = 'new';

const COLUMNS = [
  { says: 'Name' },
  { says: 'What' },
  { says: 'Inside' },
  { says: 'Carries' },
  { says: 'Temperature' },
  { says: 'Class', right: true },
];

interface EquipmentTableProps {
  equipment: readonly Equipment[];
  actions: ((of: Equipment) => React.ReactNode) | null;
}

export function EquipmentTable({ equipment, actions }: EquipmentTableProps) {
  return (
    <Table
      label="Equipment"
      columns={[...COLUMNS, ...(actions ? [{ says: 'Action', hidden: true, right: true }] : [])]}
    >
      {equipment.map((one) => (
        <Row key={one.id}>
          <Cell code strong>
            {one.name}
          </Cell>
          <Cell head="What">{one.kind}</Cell>
          <Cell code head="Inside">
            {[one.length, one.width, one.height].map(({ entered }) => entered).join(' × ')}
          </Cell>
          <Cell code head="Carries">
            {one.limit?.entered}
          </Cell>
          <Cell code head="Temperature">
            {temperatures(one)}
          </Cell>
          <Cell figure head="Class">
            {one.furnaceClass}
          </Cell>
          {actions && <Cell right>{actions(one)}</Cell>}
        </Row>
      ))}
    </Table>
  );
}

function temperatures({ temperatureMin, temperatureMax }: Equipment): string {
  if (temperatureMin && temperatureMax) return `${temperatureMin.entered} to ${temperatureMax.entered}`;
  if (temperatureMax) return `up to ${temperatureMax.entered}`;
  return temperatureMin ? `from ${temperatureMin.entered}` : '';
}

function EquipmentActions({
  processorId,
  of,
  open,
}: {
  processorId: string;
  of: Equipment;
  open: () => void;
}) {
  const retire = useWrite(retireEquipment, { refreshes: [listEquipment] });
  const add = useWrite(addEquipment, { refreshes: [listEquipment] });
  const failed = (error: Error) => showMessage({ says: error.message, failed: true });
  const undo = () =>
    add.mutate(
      {
        processorId,
        kind: of.kind,
        name: of.name,
        length: of.length.entered,
        width: of.width.entered,
        height: of.height.entered,
        limit: of.limit?.entered ?? '',
        temperatureMin: of.temperatureMin?.entered ?? '',
        temperatureMax: of.temperatureMax?.entered ?? '',
        furnaceClass: of.furnaceClass,
      },
      { onError: failed },
    );
  const takeOut = () =>
    retire.mutate(
      { processorId, equipmentId: of.id },
      {
        onSuccess: () =>
          showMessage({ says: `${of.name} is out of use.`, action: { says: 'Undo', run: undo } }),
        onError: failed,
      },
    );
  return (
    <span className="flex flex-wrap justify-end gap-x-4">
      <Button look="word" onClick={open}>
        Change<span className="sr-only"> {of.name}</span>
      </Button>
      <Button look="word" busy={retire.isPending} busyLabel="Taking out" onClick={takeOut}>
        Take out of use<span className="sr-only"> {of.name}</span>
      </Button>
    </span>
  );
}
