import type { Alloy } from '@/lib/trade/alloys/alloy';
import { explainCondition } from '@/lib/trade/tempers/explain-condition';
import type { Temper } from '@/lib/trade/tempers/temper';

import type { Order, OrderLine } from '../../order';
import type { Check, Compared } from './compared';
import { cannotTell, meets, notStated, wrong, type Outcome } from './outcome';
import { alloyIn, formIn, saysClad, tempersIn } from './tempers-in';

const orderedAlloy = ({ requirements }: Order, line?: OrderLine): string | null =>
  line?.material && alloyKey(line.material) ? alloyKey(line.material) : alloyKey(requirements.alloy ?? '');

/** The alloy's name where the tables know it, else a number of four digits in its place. */
function alloyKey(written: string): string | null {
  const known = alloyIn(written);
  if (known) return known;
  const number =
    /^\W*(?:(?:al|alum|aluminum|aluminium|alclad|clad|aa|aisi|sae|steel|alloy)\W+)*(\d{4})(?!\d)/i;
  return number.exec(written)?.[1] ?? null;
}

/** The metal is the one that was sent: by the line where it says so, else by the whole certificate. */
export const isOrderedAlloy: Check = (compared) => {
  const byLine = compared.pairs.pairs.flatMap((pair) => alloyOfLine(pair, compared.order));
  return byLine.length > 0 ? byLine : alloyOfWhole(compared);
};

function alloyOfLine({ ordered, stated }: Compared['pairs']['pairs'][number], order: Order): Outcome[] {
  const asked = orderedAlloy(order, ordered);
  const written = stated.flatMap(({ line }) => line.material ?? []);
  const [first] = written.filter((material) => alloyKey(material) !== null);
  if (asked === null || first === undefined) return [];
  const says = { requirement: `alloy ${asked}`, line: ordered.line, ordered: asked };
  const other = written.find((material) => alloyKey(material) !== null && alloyKey(material) !== asked);
  if (other === undefined) return [meets({ ...says, stated: first }, 'It is the alloy ordered.')];
  return [
    wrong(
      'wrong_alloy',
      { ...says, stated: other },
      `${ordered.part_number} is of ${asked}, the certificate says ${other}.`,
    ),
  ];
}

function alloyOfWhole({ stated, order }: Compared): Outcome[] {
  const asked = orderedAlloy(order);
  if (asked === null) return [];
  const says = { requirement: `alloy ${asked}`, ordered: asked };
  const written = stated.alloy ?? stated.class_type;
  const given = written === null ? null : alloyKey(written);
  if (given === null) return [notStated(says)];
  if (given === asked) return [meets({ ...says, stated: written }, 'It is the alloy ordered.')];
  return [
    wrong(
      'wrong_alloy',
      { ...says, stated: written },
      `The order is for ${asked}, the certificate says ${given}.`,
    ),
  ];
}

const HARDENED = /^[A-Z]{1,3}\d{2,4}$/;

/** The condition after the work is the one ordered, and none that only a mill makes. */
export const isOrderedCondition: Check = (compared) => {
  const { stated, order } = compared;
  const ordered = order.requirements.temper_out ?? tempersIn(order.class_type ?? '').at(-1);
  if (!ordered) return [];
  const out = tempersIn(ordered).at(-1);
  if (!out) return freeCondition(ordered, compared);
  const said = [stated.condition, stated.class_type].flatMap((text) => tempersIn(text ?? '').at(-1) ?? []);
  const asked = { requirement: `condition ${out}`, ordered: out, stated: said[0] ?? null };
  const lines = conditionsOfLines(compared, out);
  const { from } = materialOf(order);
  const other = said.find((temper) => temper !== out && temper !== from);
  if (other !== undefined)
    return [
      otherCondition(
        { ...asked, line: null, stated: other },
        { out, given: other, tables: compared.tables },
        materialOf(order),
      ),
    ];
  if (said.includes(out))
    return [
      meets({ ...asked, stated: out }, 'It is the condition ordered.'),
      ...lines.filter(({ wrong }) => wrong),
    ];
  return lines.length > 0 ? lines : [notStated(asked)];
};

/** Conditions of steel: `H1025` against `H900`. Anything else is for people to read. */
function freeCondition(ordered: string, { stated }: Compared): Outcome[] {
  const asked = { requirement: `condition ${ordered}`, ordered, stated: stated.condition };
  if (stated.condition === null) return [notStated(asked)];
  const words = (text: string) => text.toUpperCase().split(/[^A-Z0-9]+/);
  if (words(ordered).every((word) => words(stated.condition ?? '').includes(word)))
    return [meets(asked, 'It is the condition ordered.')];
  const [given] = words(stated.condition).filter((word) => HARDENED.test(word));
  if (given === undefined || !HARDENED.test(ordered.toUpperCase()))
    return [cannotTell(asked, 'The words have to be compared.')];
  return [wrong('wrong_temper', asked, `The order asks for ${ordered}, the certificate says ${given}.`)];
}

interface Metal {
  readonly alloy: Alloy | null;
  readonly words: string;
  readonly from: Temper | undefined;
}

function materialOf({ requirements, lines, class_type }: Order, line = lines[0]): Metal {
  const words = line?.material ?? requirements.alloy ?? '';
  return {
    alloy: alloyIn(words) ?? alloyIn(requirements.alloy ?? ''),
    words,
    from: tempersIn(requirements.temper_in ?? '')[0] ?? tempersIn(class_type ?? '')[0] ?? tempersIn(words)[0],
  };
}

/** A line's material names the condition before or after the work; any other is neither. */
function conditionsOfLines({ pairs, order, tables }: Compared, out: Temper): Outcome[] {
  return pairs.pairs.flatMap(({ ordered, stated }) => {
    const named = stated.flatMap(({ line }) => tempersIn(line.material ?? ''));
    const metal = materialOf(order, ordered);
    const before = tempersIn(ordered.material ?? '');
    const asked = { requirement: `condition ${out}`, line: ordered.line, ordered: out };
    const given = named.find((temper) => temper !== out && temper !== metal.from && !before.includes(temper));
    if (given !== undefined)
      return [otherCondition({ ...asked, stated: given }, { out, given, tables }, metal)];
    return named.includes(out) ? [meets({ ...asked, stated: out }, 'It is the condition ordered.')] : [];
  });
}

function otherCondition(
  asked: { requirement: string; line: number | null; ordered: string; stated: string | null },
  { out, given, tables }: { out: Temper; given: Temper; tables: Compared['tables'] },
  { alloy, words, from }: Metal,
): Outcome {
  const says = `The order asks for ${out}, the certificate says ${given}.`;
  if (alloy === null || from === undefined) return wrong('wrong_temper', asked, says);
  const material = { alloy, form: formIn(words), clad: saysClad(words) };
  const reach = explainCondition(tables.conditions, { material, from, to: given });
  if (reach.ok && reach.reach === 'cannot_be_made')
    return wrong(
      'impossible_temper',
      asked,
      `${says} No heat treater makes ${given} of ${alloy}-${from}${reach.gives ? `; trying gives ${reach.gives.condition}` : ''} (${reach.source.document}).`,
    );
  const name =
    reach.ok && reach.reach === 'made_under_other_name'
      ? ` ${given} is the mill's name; made of ${from} by a heat treater it is ${reach.properName}.`
      : '';
  return wrong('wrong_temper', asked, `${says}${name}`);
}
