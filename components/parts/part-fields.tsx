'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { Checkbox } from '@/components/ui/choice';
import { SelectField, TextArea, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import { PRODUCT_FORMS } from '@/lib/trade/process';
import { AlloyAdvice } from './alloy-advice';
import { ComputedSize } from './computed-size';
import { ConditionAdvice, ConditionList } from './condition-advice';
import type { PartValues } from './part-form-values';

interface Frozen {
  number?: string | undefined;
  revision?: string | undefined;
  serialised?: string | undefined;
}

export function IdentityFields({ frozen }: { frozen: Frozen }) {
  const { register, formState, control } = useFormContext<PartValues>();
  const { errors } = formState;
  const [made, end] = useWatch({ control, name: ['madeCondition', 'endCondition'] });
  return (
    <Section title="The part">
      <div className="grid grid-cols-6 gap-x-4 gap-y-3 py-2 max-lg:grid-cols-4 max-md:grid-cols-2">
        <TextField
          className="col-span-2"
          label="Drawing number"
          mono
          autoComplete="off"
          frozen={frozen.number}
          error={errors.number?.message}
          {...register('number')}
        />
        <TextField
          className="max-lg:col-span-2"
          label="Revision"
          mono
          autoComplete="off"
          frozen={frozen.revision}
          error={errors.revision?.message}
          {...register('revision')}
        />
        <TextField
          className="col-span-3 max-lg:col-span-4 max-md:col-span-2"
          label="Name"
          autoComplete="off"
          error={errors.name?.message}
          {...register('name')}
        />
        <TextField
          className="col-span-2"
          label="Alloy"
          hint="as on the drawing: 2024, 6061, 4130"
          autoComplete="off"
          error={errors.alloy?.message}
          {...register('alloy')}
        />
        <SelectField
          className="max-md:col-span-2"
          label="Product form"
          empty="Choose"
          options={PRODUCT_FORMS.map((value) => ({ value, says: value }))}
          error={errors.form?.message}
          {...register('form')}
        />
        <TextField
          label="Thickness"
          mono
          hint="0.040 in or 1 mm"
          autoComplete="off"
          error={errors.thickness?.message}
          {...register('thickness')}
        />
        <TextField
          className="max-lg:col-span-2 max-md:col-span-1"
          label="Made in"
          mono
          hint="O"
          autoComplete="off"
          error={errors.madeCondition?.message}
          list="conditions-made"
          {...register('madeCondition')}
        />
        <TextField
          className="max-lg:col-span-2 max-md:col-span-1"
          label="Must end in"
          mono
          hint="T42"
          autoComplete="off"
          error={errors.endCondition?.message}
          list="conditions-end"
          {...register('endCondition')}
        />
      </div>
      <ConditionList id="conditions-made" />
      <ConditionList id="conditions-end" after={made} />
      <AlloyAdvice />
      <ConditionAdvice from={made} to={end} maker="route" />
      <div className="flex flex-wrap items-center gap-x-9">
        <Checkbox says="Clad" note="both faces or one" {...register('clad')} />
        {frozen.serialised === undefined ? (
          <Checkbox
            says="Each piece has its own serial"
            error={errors.serialised?.message}
            {...register('serialised')}
          />
        ) : (
          <p className="py-[5px] text-second text-quiet">{frozen.serialised}</p>
        )}
      </div>
    </Section>
  );
}

const SIZES = [
  { name: 'length', label: 'Length', hint: '61.5 in' },
  { name: 'width', label: 'Width', hint: '8 in' },
  { name: 'height', label: 'Height', hint: '1 1/4 in' },
  { name: 'mass', label: 'Mass of one', hint: '0.41 lb or 186 g' },
  { name: 'area', label: 'Area of one', hint: '1.78 ft² or 1650 cm²' },
] as const;

export function SizeFields() {
  const { register, formState } = useFormContext<PartValues>();
  return (
    <Section title="Size" note="with its unit, as you read it">
      <div className="grid grid-cols-2 gap-x-4 gap-y-3 py-2">
        {SIZES.map(({ name, label, hint }) => (
          <TextField
            key={name}
            label={label}
            mono
            hint={hint}
            autoComplete="off"
            error={formState.errors[name]?.message}
            {...register(name)}
          />
        ))}
      </div>
      <ComputedSize />
    </Section>
  );
}

export function NoteField() {
  const { register, formState } = useFormContext<PartValues>();
  return (
    <Section title="Note">
      <TextArea
        label="For the shop; it does not print on the traveller"
        rows={4}
        error={formState.errors.note?.message}
        {...register('note')}
      />
    </Section>
  );
}
