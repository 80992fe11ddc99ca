'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { TextArea, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { getProcessor, listProcessors, updateProcessor, type Processor } from '@/lib/processors/contract';

export function ContactForm({ processor, done }: { processor: Processor; done: () => void }) {
  const write = useWrite(updateProcessor, { refreshes: [getProcessor, listProcessors] });
  const { processorId, version, contactName, contactEmail, note, active } = processor;
  const form = useForm({
    defaultValues: { contactName: contactName ?? '', contactEmail, note: note ?? '', active },
  });
  const { errors } = form.formState;
  const saved = () => {
    showMessage({ says: `${processor.name} saved.` });
    done();
  };
  const save = form.handleSubmit((typed) =>
    write.mutate({ processorId, version, ...typed }, { onSuccess: saved, onError: showOnForm(form) }),
  );
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-3 pt-1">
      <TextField
        label="Name of the contact"
        autoComplete="off"
        error={errors.contactName?.message}
        {...form.register('contactName')}
      />
      <TextField
        label="Mails about batches go to"
        type="email"
        autoComplete="off"
        error={errors.contactEmail?.message}
        {...form.register('contactEmail')}
      />
      <TextArea
        label="Note"
        rows={3}
        hint="for your shop only"
        error={errors.note?.message}
        {...form.register('note')}
      />
      <Checkbox
        says="We send parts there"
        note="unticked: nothing new is dispatched to it"
        {...form.register('active')}
      />
      <FormRefusal says={errors.root?.message} />
      <div className="flex flex-wrap gap-2.5">
        <Button type="submit" busy={write.isPending} busyLabel="Saving">
          Save the contact
        </Button>
        <Button onClick={done}>Leave it</Button>
      </div>
    </form>
  );
}
