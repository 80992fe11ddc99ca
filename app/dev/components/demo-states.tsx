import { Amount } from '@/components/ui/amount';
import { Button } from '@/components/ui/button';
import { Day, LateFlag, Moment, Until } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { LoadNumber, StepNumber } from '@/components/ui/frame-number';
import { Kbd } from '@/components/ui/kbd';
import { Loading } from '@/components/ui/loading';
import { Pieces } from '@/components/ui/pieces';
import { Progress } from '@/components/ui/progress';
import { Section } from '@/components/ui/section';
import { Segments } from '@/components/ui/segments';

const clock = { zone: 'America/Halifax', now: new Date('2026-04-16T11:40:00Z') };

export function DemoStates() {
  return (
    <div className="flex min-w-0 flex-col gap-6">
      <Section title="Empty, failing, waiting">
        <Empty
          says="No lot waits for anodize."
          comes="Lots come here when their step before is done."
          action={<Button look="word">Show all lots</Button>}
        />
        <Failing
          says="The mail to Ostrow did not leave."
          stands="The batch is dispatched and the pieces are moved."
          again="We try again at 07:20, then every hour."
          actions={
            <>
              <Button look="word">Send now</Button>
              <Button look="word">Print the traveller</Button>
            </>
          }
        />
        <Edge level="warn">
          <strong>No network.</strong> You see 08:31 of today. What you count is kept on this tablet and sent
          later; signing waits.
        </Edge>
        <Progress says="Reading the certificate" value={2} of={3} where="page 2 of 3" />
        <Loading rows={3} />
      </Section>
      <Section title="Words and figures" action={<Kbd keys="J K" says="move" />}>
        <p className="flex flex-wrap items-center gap-x-5 gap-y-2 py-2">
          <Day day="2026-04-30" clock={clock} />
          <Day day="2027-01-11" clock={clock} />
          <Moment at={new Date('2026-04-15T19:40:00Z')} clock={clock} />
          <Until day="2026-04-10" clock={clock} />
          <Until day="2026-04-21" clock={clock} />
          <LateFlag days={6} />
          <Amount minor={28240} />
          <Amount minor={-3345} currency="USD" />
          <Pieces count={41} />
          <Pieces count={38} of={41} />
          <LoadNumber number={1} />
          <LoadNumber number={2} />
          <LoadNumber number={3} />
          <StepNumber number={1} state="done" />
          <StepNumber number={2} state="late" />
          <StepNumber number={3} />
        </p>
        <Segments
          label="Show"
          items={[
            { says: 'All shops', current: true, href: '/dev/components' },
            { says: 'Tern Slip', count: 5, current: false, href: '/dev/components?shop=1' },
            { says: 'Haddow', count: 3, current: false, href: '/dev/components?shop=2' },
          ]}
        />
      </Section>
    </div>
  );
}
