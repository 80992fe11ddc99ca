/** Above it, trying all ways would take too long, and a good way is taken. */
export const MOST_FOR_EXACT = 12;

export interface Partition {
  readonly method: 'exact' | 'good';
  /** Positions of what is together. */
  readonly loads: readonly (readonly number[])[];
}

/**
 * Splits things into the fewest loads. Up to twelve all ways are considered, so that no plan has fewer; above, several
 * orders are tried, each thing put into the first load that takes it, and the best is kept and said to be good only.
 *
 * @param count how many things, by position from 0.
 * @param mayShare whether these may be together; a single one always may.
 */
export const fewestLoads = (count: number, mayShare: (together: readonly number[]) => boolean): Partition =>
  count <= MOST_FOR_EXACT
    ? { method: 'exact', loads: exactly(count, mayShare) }
    : { method: 'good', loads: inGoodOrder(count, mayShare) };

/**
 * Over all sets, as bits: the fewest loads of a set are one load that holds its first member, and the fewest loads of
 * the rest.
 */
function exactly(count: number, mayShare: (together: readonly number[]) => boolean): number[][] {
  const all = 2 ** count;
  const fits = Array.from(
    { length: all },
    (_, set) => set !== 0 && (isSingle(set) || mayShare(membersOf(set))),
  );
  const fewest = new Array<number>(all).fill(Infinity);
  const firstLoad = new Array<number>(all).fill(0);
  fewest[0] = 0;
  for (let set = 1; set < all; set++) {
    const first = set & -set;
    const others = set ^ first;
    // Each way to choose companions for the first member, all of them first.
    for (let companions = others; ; companions = (companions - 1) & others) {
      const load = first | companions;
      const loads = 1 + (fewest[set ^ load] ?? Infinity);
      if (fits[load] && loads < (fewest[set] ?? Infinity)) {
        fewest[set] = loads;
        firstLoad[set] = load;
      }
      if (companions === 0) break;
    }
  }
  const plan: number[][] = [];
  for (let left = all - 1; left !== 0; left ^= firstLoad[left] ?? left)
    plan.push(membersOf(firstLoad[left] ?? left));
  return plan;
}

const isSingle = (set: number) => (set & (set - 1)) === 0;

function membersOf(set: number): number[] {
  const members = [];
  for (let at = 0; 2 ** at <= set; at++) if (set & (2 ** at)) members.push(at);
  return members;
}

function inGoodOrder(count: number, mayShare: (together: readonly number[]) => boolean): number[][] {
  const given = Array.from({ length: count }, (_, at) => at);
  const friends = given.map((at) => given.filter((other) => other !== at && mayShare([at, other])).length);
  const hardestFirst = [...given].sort((a, b) => (friends[a] ?? 0) - (friends[b] ?? 0));
  const plans = [hardestFirst, given, [...given].reverse()].map((order) => firstFit(order, mayShare));
  return plans.reduce((best, plan) => (plan.length < best.length ? plan : best));
}

function firstFit(order: readonly number[], mayShare: (together: readonly number[]) => boolean): number[][] {
  const loads: number[][] = [];
  for (const at of order) {
    const load = loads.find((together) => mayShare([...together, at]));
    if (load) load.push(at);
    else loads.push([at]);
  }
  return loads;
}
