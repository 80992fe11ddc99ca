'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { addEquipment, changeEquipment, listEquipment, type Equipment } from '@/lib/equipment/contract';
import { EQUIPMENT_KINDS, type EquipmentKind } from '@/lib/equipment/equipment-kind';

interface EquipmentFormProps {
  processorId: string;
  /** What is changed; null: a new one. */
  of: Equipment | null;
  done: () => void;
}

const FIELDS = [
  { name: 'length', label: 'Length inside', hint: '120 in' },
  { name: 'width', label: 'Width inside', hint: '44 in' },
  { name: 'height', label: 'Height inside', hint: '40 in' },
  { name: 'limit', label: 'Carries', hint: '600 lb or 270 kg' },
  { name: 'temperatureMin', label: 'From', hint: '300 °F' },
  { name: 'temperatureMax', label: 'To', hint: '1050 °F' },
] as const;

const CLASSES = [1, 2, 3, 4, 5, 6].map((one) => ({ value: String(one), says: `class ${one}` }));

/** Room inside, what it carries and how hot it gets, each with its unit as it is read off the paper. */
export function EquipmentForm({ processorId, of, done }: EquipmentFormProps) {
  const add = useWrite(addEquipment, { refreshes: [listEquipment] });
  const change = useWrite(changeEquipment, { refreshes: [listEquipment] });
  const form = useForm({ defaultValues: valuesOf(of) });
  const { errors } = form.formState;
  const save = form.handleSubmit(({ furnaceClass, ...typed }) => {
    const given = { processorId, ...typed, furnaceClass: furnaceClass === '' ? null : Number(furnaceClass) };
    const outcome = {
      onSuccess: () => {
        showMessage({ says: `${typed.name} is ${of ? 'changed' : 'added'}.` });
        done();
      },
      onError: showOnForm(form),
    };
    if (of) change.mutate({ ...given, equipmentId: of.id, version: of.version }, outcome);
    else add.mutate(given, outcome);
  });
  return (
    <form
      noValidate
      aria-label={of ? `Change ${of.name}` : 'Add equipment'}
      onSubmit={(event) => void save(event)}
      className="flex flex-col gap-3 border-b border-rule pt-1 pb-4"
    >
      <div className="grid grid-cols-3 gap-x-4 gap-y-3 max-md:grid-cols-2">
        <SelectField
          label="What it is"
          options={EQUIPMENT_KINDS.map((value) => ({ value, says: value }))}
          error={errors.kind?.message}
          {...form.register('kind')}
        />
        <TextField
          label="Name or number"
          mono
          autoComplete="off"
          autoFocus
          error={errors.name?.message}
          {...form.register('name')}
        />
        <SelectField
          label="Furnace class"
          empty="not known"
          options={CLASSES}
          error={errors.furnaceClass?.message}
          {...form.register('furnaceClass')}
        />
        {FIELDS.map(({ name, label, hint }) => (
          <TextField
            key={name}
            label={label}
            mono
            hint={hint}
            autoComplete="off"
            error={errors[name]?.message}
            {...form.register(name)}
          />
        ))}
      </div>
      <FormRefusal says={errors.root?.message} />
      <div className="flex flex-wrap gap-2.5">
        <Button
          type="submit"
          look="primary"
          busy={add.isPending || change.isPending}
          busyLabel={of ? 'Saving' : 'Adding'}
        >
          {of ? 'Save it' : 'Add it'}
        </Button>
        <Button onClick={done}>Leave it</Button>
      </div>
    </form>
  );
}

const valuesOf = (of: Equipment | null) => ({
  kind: of?.kind ?? ('furnace' as EquipmentKind),
  name: of?.name ?? '',
  length: of?.length.entered ?? '',
  width: of?.width.entered ?? '',
  height: of?.height.entered ?? '',
  limit: of?.limit?.entered ?? '',
  temperatureMin: of?.temperatureMin?.entered ?? '',
  temperatureMax: of?.temperatureMax?.entered ?? '',
  furnaceClass: of?.furnaceClass ? String(of.furnaceClass) : '',
});
