'use client';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button, ButtonLink } from '@/components/ui/button';
import { TextArea, TextField } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { addProcessor, listProcessors } from '@/lib/processors/contract';

export function NewProcessorScreen() {
  const router = useRouter();
  const write = useWrite(addProcessor, { refreshes: [listProcessors] });
  const form = useForm({
    defaultValues: { name: '', email: '', phone: '', contactName: '', contactEmail: '', note: '' },
  });
  const { errors } = form.formState;
  const add = form.handleSubmit(({ contactEmail, ...typed }) =>
    write.mutate(
      { ...typed, contactEmail: contactEmail.trim() === '' ? null : contactEmail },
      {
        onSuccess: ({ processorId }) => router.push(`/processors/${processorId}`),
        onError: showOnForm(form),
      },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void add(event)} className="max-w-[52rem]">
      <PageHead
        title="Add a processor"
        sub="One that Lotwright knows by this e-mail is put on your list with the name it keeps itself."
      />
      <div className="flex flex-col gap-7">
        <Section title="Processor">
          <div className="grid gap-x-6 gap-y-3 pt-1 md:grid-cols-2">
            <TextField
              label="Name"
              autoComplete="off"
              error={errors.name?.message}
              {...form.register('name')}
            />
            <TextField
              label="E-mail of its desk"
              type="email"
              autoComplete="off"
              hint="what the processor is known by"
              error={errors.email?.message}
              {...form.register('email')}
            />
            <TextField
              label="Telephone"
              type="tel"
              autoComplete="off"
              error={errors.phone?.message}
              {...form.register('phone')}
            />
          </div>
        </Section>
        <Section title="Whom we deal with">
          <div className="grid gap-x-6 gap-y-3 pt-1 md:grid-cols-2">
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
              hint="left empty: its desk"
              error={errors.contactEmail?.message}
              {...form.register('contactEmail')}
            />
            <TextArea
              label="Note"
              rows={3}
              hint="for your shop only"
              className="md:col-span-2"
              error={errors.note?.message}
              {...form.register('note')}
            />
          </div>
        </Section>
        <FormRefusal says={errors.root?.message} />
        <div className="flex flex-wrap gap-2.5">
          <Button type="submit" look="primary" busy={write.isPending} busyLabel="Adding">
            Add the processor
          </Button>
          <ButtonLink href="/processors">Leave it</ButtonLink>
        </div>
      </div>
    </form>
  );
}
