import { Caution, Edge } from '@/components/ui/edge';
import { HowWell } from '@/components/ui/how-well';
import { CheckList, CheckRow, MetChecks } from '@/components/ui/check-row';
import { VERDICTS } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';
import { SteelRule } from '@/components/ui/steel-rule';
import { VerdictWord } from '@/components/ui/verdict';
import { Button } from '@/components/ui/button';

export function DemoType() {
  return (
    <div className="flex min-w-0 flex-col gap-6">
      <Section title="Type">
        <h1>Tideline</h1>
        <p className="font-mono text-thing">B-0419</p>
        <h2>What waits for me</h2>
        <h3>Ask Ostrow for a date</h3>
        <p>Only a mill makes T3: it needs cold work.</p>
        <p>
          <strong>Line 5 ends in T3.</strong>{' '}
          <span className="text-quiet">left the yard yesterday 14:05</span>
        </p>
        <p className="font-mono text-figure">0.125 920 °F 41 of 41</p>
        <p className="font-cond text-caption text-faint">Pieces</p>
        <p className="text-source text-faint">T.O. 1-1A-9 table 3-12</p>
      </Section>
      <Section title="Verdicts and how well it was read">
        <div className="flex flex-wrap gap-x-6 gap-y-2 py-2">
          {VERDICTS.map((verdict) => (
            <VerdictWord key={verdict} verdict={verdict} />
          ))}
          <VerdictWord
            verdict="does_not_meet"
            overruled={{ to: 'meets', reason: 'Order note 4 allows T6 as written. Tobias Wren, 17 Apr' }}
          />
        </div>
        <div className="flex flex-wrap gap-6">
          <HowWell quality={3} says />
          <HowWell quality={2} says />
          <HowWell quality={1} says />
        </div>
      </Section>
      <Section title="Before it leaves" note="1 stops it, 1 warns, 1 note">
        <CheckList label="Checks before dispatch">
          <CheckRow
            level="stop"
            sentence="Line 5 ends in T3."
            rest="Only a mill makes T3: it needs cold work after quench. From O, this step makes T42."
            source="Alloy and temper designations, ANSI H35.1"
            waysOut={
              <>
                <Button look="word">Take line 5 out</Button>
                <Button look="word">Ask design for T42</Button>
                <Button look="word">Override</Button>
              </>
            }
          />
          <CheckRow
            level="warn"
            sentence="Ostrow is approved to 30 Apr,"
            rest="the day you want the pieces back."
            source="Approval 14-022"
          />
          <CheckRow
            level="note"
            sentence="Load 1 has 5 minutes of room."
            rest="The traveller says so in the furnace lines."
            source="Load plan"
          />
        </CheckList>
        <MetChecks count={11}>Approved for the process. Order of steps. Size of the tank.</MetChecks>
      </Section>
      <Section title="The steel rule">
        <div className="flex flex-wrap items-end gap-7 py-2">
          <SteelRule
            says="9.2 of 15 minutes"
            to={15}
            tick={1}
            number={5}
            value={9.2}
            tone="proved"
            limit={{ at: 15, tone: 'held' }}
          />
          <SteelRule
            says="150.32 of the minimum of 180.00"
            to={250}
            tick={10}
            number={50}
            value={150.32}
            room
            limit={{ at: 180, says: 'minimum 180.00' }}
            width={376}
          />
          <SteelRule
            says="38.4 in the band 36.5 to 40.5 % IACS"
            from={34}
            to={44}
            tick={1}
            number={2}
            band={{ from: 36.5, to: 40.5 }}
            limit={{ at: 38.4 }}
          />
          <SteelRule
            says="71 of 136 pieces in stock"
            to={136}
            tick={10}
            number={50}
            value={71}
            width={100}
            small
          />
        </div>
      </Section>
      <Edge level="note">
        <strong>Reference values.</strong> Drawing, order and invoked revision come first.
      </Edge>
      <Caution>Do not straighten later than 2 h after quench.</Caution>
    </div>
  );
}
