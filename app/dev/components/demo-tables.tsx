import { Button } from '@/components/ui/button';
import { Section } from '@/components/ui/section';
import { Cell, GroupRow, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { VerdictWord } from '@/components/ui/verdict';

export function DemoTables() {
  return (
    <div className="grid gap-9 lg:grid-cols-2">
      <Section title="Table rows" note="5 lots">
        <Table
          label="Lots"
          columns={[
            { says: 'Lot', sorted: 'up' },
            { says: 'Part' },
            { says: 'Pieces', right: true },
            { says: 'Mass, lb', right: true },
            { says: 'State' },
          ]}
        >
          <LotRow lot="L-0231" part="Bulkhead web, sta 62" pieces={14} mass="5.7" says="rest" />
          <LotRow
            lot="L-0236"
            part="Chine stiffener"
            pieces={22}
            mass="6.4"
            says="selected by key or press"
            selected
          />
          <LotRow
            lot="L-0240"
            part="Step frame angle"
            pieces={8}
            mass="8.8"
            says="asks for a decision"
            state="asks"
          />
          <LotRow
            lot="L-0244"
            part="Web lightening ring"
            pieces={30}
            mass="1.2"
            says="cannot: its soak ends at 30 min"
            state="off"
          />
          <Row state="sum">
            <Cell>Sum</Cell>
            <Cell />
            <Cell figure strong head="Pieces">
              60
            </Cell>
            <Cell figure strong head="Mass, lb">
              34.8
            </Cell>
            <Cell />
          </Row>
        </Table>
      </Section>
      <Section title="What waits for me" note="oldest harm first">
        <Table
          label="What waits for me"
          columns={[
            { says: 'Batch', hidden: true },
            { says: 'What to do', hidden: true },
            { says: 'Action', hidden: true, right: true },
          ]}
        >
          <GroupRow says="Late" count={1} span={3} />
          <Row>
            <Cell>
              <BatchTag
                stage="at_processor"
                number="B-0404"
                size="row"
                show="number"
                href="/dev/components"
              />
            </Cell>
            <Cell>
              <strong>Answer Ostrow</strong>{' '}
              <span className="text-quiet">&quot;Is the bend radius .09 or .06 on line 3?&quot;</span>
            </Cell>
            <Cell right>
              <Button look="word">Answer</Button>
            </Cell>
          </Row>
          <GroupRow says="To prove" count={1} span={3} />
          <Row>
            <Cell>
              <BatchTag stage="returned" number="B-0412" size="row" show="number" href="/dev/components" />
            </Cell>
            <Cell>
              <VerdictWord verdict="to_decide" />
            </Cell>
            <Cell right>
              <Button look="word">Open</Button>
            </Cell>
          </Row>
        </Table>
      </Section>
    </div>
  );
}

interface LotRowProps {
  lot: string;
  part: string;
  pieces: number;
  mass: string;
  says: string;
  state?: 'rest' | 'asks' | 'off';
  selected?: boolean;
}

function LotRow({ lot, part, pieces, mass, says, state = 'rest', selected = false }: LotRowProps) {
  return (
    <Row state={state} {...(selected ? { selected } : {})}>
      <Cell code strong>
        {lot}
      </Cell>
      <Cell>{part}</Cell>
      <Cell figure head="Pieces">
        {pieces}
      </Cell>
      <Cell figure head="Mass, lb">
        {mass}
      </Cell>
      <Cell quiet={state === 'rest'}>
        {state === 'asks' ? <strong className="text-held-ink">{says}</strong> : says}
      </Cell>
    </Row>
  );
}
