import { Button, type ButtonLook } from '@/components/ui/button';
import { Checkbox, CheckboxGroup, RadioGroup } from '@/components/ui/choice';
import { DateField, NumberInput, SelectField, TextArea, TextField } from '@/components/ui/field';
import { PieceCounter } from '@/components/ui/piece-counter';
import { Section } from '@/components/ui/section';
import { DemoFileDrop } from './demo-live';

const LOOKS: readonly { look: ButtonLook; says: string; busy: string; not: string }[] = [
  { look: 'primary', says: 'Dispatch', busy: 'Sending, 2 of 3', not: '1 check stops it' },
  { look: 'outlined', says: 'Put aside', busy: 'Saving', not: 'It has left' },
  { look: 'stop', says: 'Hold 41', busy: 'Holding', not: 'Nothing is here yet' },
];

export function DemoForms() {
  return (
    <div className="grid gap-9 lg:grid-cols-2">
      <Section title="Buttons">
        {LOOKS.map(({ look, says, busy, not }) => (
          <div key={look} className="flex flex-wrap items-center gap-4 py-2.5">
            <Button look={look}>{says}</Button>
            <span className="lw-focus inline-flex">
              <Button look={look}>{says}</Button>
            </span>
            <Button look={look} busy busyLabel={busy}>
              {says}
            </Button>
            <Button look={look} notNow={not}>
              {says}
            </Button>
            <Button look={look} size="small">
              {says}
            </Button>
          </div>
        ))}
        <div className="flex flex-wrap items-center gap-4 py-2.5">
          <Button look="word">Show all lots</Button>
          <Button look="word" shortcut="A">
            Add a lot
          </Button>
          <Button shortcut="E">Read it differently</Button>
          <Button size="big">Count in</Button>
          <Button size="big" look="primary">
            Sign for 40
          </Button>
        </div>
      </Section>
      <Section title="Fields">
        <div className="grid gap-x-5 gap-y-4 py-2 sm:grid-cols-2">
          <NumberInput
            label="Thickness"
            unit="in"
            hint="as on the drawing; kept as you type it"
            defaultValue="0.063"
          />
          <NumberInput label="Pieces" defaultValue="44" error="The lot has 41. Enter 41 or less." />
          <TextField label="Drawing" frozen="frozen at dispatch" defaultValue="FL-4431-08 rev C" />
          <SelectField
            label="Ends in"
            defaultValue="T3"
            error="From O this step makes T42."
            options={[
              { value: 'T3', says: 'T3' },
              { value: 'T42', says: 'T42' },
            ]}
          />
          <DateField label="Promised" defaultValue="2026-04-17" />
          <SelectField
            label="Processor"
            empty="Choose a processor"
            options={[{ value: '1', says: 'Ostrow Heat Treating' }]}
          />
          <CheckboxGroup
            label="Covers"
            chosen={['1']}
            options={[
              { value: '1', says: 'line 1', note: '16 pieces' },
              { value: '2', says: 'line 2', note: '15 pieces' },
            ]}
          />
          <RadioGroup
            label="Units"
            chosen={['inch']}
            options={[
              { value: 'inch', says: 'inch and °F' },
              { value: 'metric', says: 'mm and °C' },
            ]}
          />
          <PieceCounter label="Good" defaultValue="40" max={41} />
          <PieceCounter label="Damaged" defaultValue="3" error="41 were sent, 43 are counted. Count again." />
          <DemoFileDrop />
          <TextArea label="Reason" hint="20 letters or more; the processor and the auditor read it" />
          <Checkbox says="I have counted every piece" error="Tick this before you sign." />
        </div>
      </Section>
    </div>
  );
}
