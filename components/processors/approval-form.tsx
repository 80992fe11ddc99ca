'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { CheckboxGroup } from '@/components/ui/choice';
import { DateField, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { addDays } from '@/lib/day-words';
import { PROCESS_WORDS, PROCESSES, type Process } from '@/lib/trade/process';
import { addApproval, getProcessor, listProcessors } from '@/lib/processors/contract';

interface ApprovalFormProps {
  processorId: string;
  today: string;
  done: () => void;
}

export function ApprovalForm({ processorId, today, done }: ApprovalFormProps) {
  const write = useWrite(addApproval, { refreshes: [getProcessor, listProcessors] });
  const form = useForm({
    defaultValues: {
      reference: '',
      processes: [] as Process[],
      specifications: '',
      validFrom: today,
      validTo: addDays(today, 365),
    },
  });
  const { errors } = form.formState;
  const saved = () => {
    showMessage({ says: 'Approval added.' });
    done();
  };
  const save = form.handleSubmit(({ specifications, ...typed }) => {
    const named = specifications.split(',').map((one) => one.trim());
    write.mutate(
      { processorId, ...typed, specifications: named.filter((one) => one !== '') },
      { onSuccess: saved, onError: showOnForm(form) },
    );
  });
  return (
    <form
      noValidate
      onSubmit={(event) => void save(event)}
      className="flex flex-col gap-3 border-b border-rule pt-1 pb-4"
    >
      <div className="grid gap-x-6 gap-y-3 md:grid-cols-3">
        <TextField
          label="Approval"
          mono
          hint="its number in your quality papers"
          autoComplete="off"
          autoFocus
          error={errors.reference?.message}
          {...form.register('reference')}
        />
        <DateField label="From" error={errors.validFrom?.message} {...form.register('validFrom')} />
        <DateField label="To, inclusive" error={errors.validTo?.message} {...form.register('validTo')} />
        <TextField
          label="Specifications"
          mono
          hint="with commas between; left empty: any for these processes"
          className="md:col-span-3"
          autoComplete="off"
          error={errors.specifications?.message}
          {...form.register('specifications')}
        />
      </div>
      <CheckboxGroup
        label="Processes"
        className="gap-x-6 md:columns-3"
        options={PROCESSES.map((process) => ({ value: process, says: PROCESS_WORDS[process] }))}
        error={errors.processes?.message}
        {...form.register('processes')}
      />
      <FormRefusal says={errors.root?.message} />
      <div className="flex flex-wrap gap-2.5">
        <Button type="submit" look="primary" busy={write.isPending} busyLabel="Adding">
          Add the approval
        </Button>
        <Button onClick={done}>Leave it</Button>
      </div>
    </form>
  );
}
