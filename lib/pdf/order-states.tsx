import { View } from '@react-pdf/renderer';

import { linesWords } from '@/lib/parts/lines-words';
import type { StatedForLines } from '@/lib/travellers/content';

import { Asked, Heading } from './paper-parts';

/** What the specification asks the order to state, in two columns. */
export function OrderStates({ states }: { states: readonly StatedForLines[] }) {
  const half = Math.ceil(states.length / 2);
  return (
    <View style={{ marginTop: 8 }}>
      <Heading title="The order states" />
      <View style={{ flexDirection: 'row' }}>
        {[states.slice(0, half), states.slice(half)].map((column, at) => (
          <View key={at} style={{ flexGrow: 1, flexBasis: 0, ...(at === 0 ? { marginRight: 15 } : {}) }}>
            {column.map(({ item, says, lines }) => (
              <Asked
                key={`${item} ${says}`}
                name={item}
                says={says}
                {...(lines.length > 0 ? { rest: linesWords(lines) } : {})}
              />
            ))}
          </View>
        ))}
      </View>
    </View>
  );
}
