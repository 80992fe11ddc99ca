import { Checkbox } from '@/components/ui/choice';
import { sourceWords } from '@/lib/batches/source-words';
import { orderFactsOf, orderItemsOf } from '@/lib/parts/order-facts';
import { ORDER_FACT_WORDS, ORDERING_KIND_WORDS } from '@/lib/reference/ordering-words';
import type { SpecificationReference } from '@/lib/trade/lineage/recognise-specification';
import { missingItems } from '@/lib/trade/ordering/missing-items';
import { ORDER_FACTS, ORDER_ITEM_WORDS, ORDER_ITEMS, type OrderItem } from '@/lib/trade/ordering/order-item';
import {
  factsAskedFor,
  orderingChecklist,
  type ChecklistItem,
  type OrderingKind,
} from '@/lib/trade/ordering/ordering-checklist';
import { MISSING_ITEMS } from '@/lib/trade/tables/missing-items';
import { ORDERING_INFORMATION } from '@/lib/trade/tables/ordering-information';

import { NoAnswer } from './answer';
import type { Bench } from './use-bench';

const FIRMEST_FIRST: readonly OrderingKind[] = [
  'must_state',
  'must_be_agreed',
  'should_state',
  'state_or_default',
  'default',
];

interface OrderChecklistProps {
  /** As it is called: with its issue, type and class. */
  called: SpecificationReference;
  bench: Bench<'so' | 'stated'>;
}

/** What the order has to state, to be ticked off; what is left is named. */
export function OrderChecklist({ called: { number, revision, rest }, bench }: OrderChecklistProps) {
  const said = orderFactsOf(rest);
  const open = factsAskedFor(ORDERING_INFORMATION, number).filter((fact) => !said.includes(fact));
  const ticked = ORDER_FACTS.filter((fact) => open.includes(fact) && wordsIn(bench.typed.so).includes(fact));
  const facts = [...said, ...ticked];
  const checklist = orderingChecklist(ORDERING_INFORMATION, number, facts);
  const called: OrderItem[] = [
    ...(revision === null ? [] : (['specification_and_revision'] as const)),
    ...orderItemsOf(rest),
  ];
  const stated = ORDER_ITEMS.filter((item) => wordsIn(bench.typed.stated).includes(item));
  const left = missingItems({ ordering: ORDERING_INFORMATION, commonest: MISSING_ITEMS }, number, {
    stated: [...called, ...stated],
    facts,
  });
  const missing = left.ok ? left.missing.map(({ item }) => ORDER_ITEM_WORDS[item]) : [];
  return (
    <>
      <h3 className="pt-5">What the order states</h3>
      {checklist.ok ? (
        <>
          {open.length > 0 && (
            <div role="group" aria-label="So of this order" className="pb-2">
              <p className="text-second text-quiet">
                Tick what is so of this order; it changes what is asked.
              </p>
              {open.map((fact) => (
                <Checkbox
                  key={fact}
                  says={<Capital says={ORDER_FACT_WORDS[fact]} />}
                  checked={ticked.includes(fact)}
                  onChange={() => bench.set({ so: toggled(ticked, fact) })}
                />
              ))}
            </div>
          )}
          <p
            className={`border-l-4 py-[3px] pl-3 ${missing.length > 0 ? 'border-dispatched' : 'border-proved'}`}
          >
            {missing.length > 0
              ? `Not stated yet: ${missing.join('; ')}.`
              : 'All that is asked for is stated; for the rest the specification says what applies.'}
          </p>
          <ul aria-label="What the order states" className="pt-2">
            {FIRMEST_FIRST.flatMap((kind) => checklist.items.filter((one) => one.kind === kind)).map(
              (one) => (
                <li key={one.item} className="border-b border-rule py-1">
                  <Checkbox
                    says={
                      <strong>
                        <Capital says={ORDER_ITEM_WORDS[one.item]} />
                      </strong>
                    }
                    note={called.includes(one.item) ? 'said in the call-out' : howAsked(one)}
                    disabled={called.includes(one.item)}
                    checked={called.includes(one.item) || stated.includes(one.item)}
                    onChange={() => bench.set({ stated: toggled(stated, one.item) })}
                  />
                  <p className="pb-1 pl-7 text-source text-quiet">{whereAsked(one)}</p>
                </li>
              ),
            )}
          </ul>
        </>
      ) : (
        <NoAnswer says="What an order to it must state is not recorded here. Look in its own ordering information." />
      )}
    </>
  );
}

const Capital = ({ says }: { says: string }) => (
  <span className="inline-block first-letter:uppercase">{says}</span>
);

const howAsked = ({ kind, otherwise }: ChecklistItem): string =>
  `${ORDERING_KIND_WORDS[kind]}${otherwise === undefined ? '' : `; otherwise ${otherwise}`}`;

const whereAsked = ({ issue, paragraph, source }: ChecklistItem): string =>
  [
    sourceWords(source),
    ...(issue === null ? [] : [`of issue ${issue}`]),
    ...(paragraph === null ? [] : [`paragraph ${paragraph}`]),
  ].join('; ');

const wordsIn = (typed: string): string[] => typed.split(' ');

const toggled = <Word extends string>(words: readonly Word[], word: Word): string =>
  (words.includes(word) ? words.filter((one) => one !== word) : [...words, word]).join(' ');
