import { Text, View } from '@react-pdf/renderer';

import { linesWords } from '@/lib/parts/lines-words';
import type { TravellerContent, TravellerLoads as Loads } from '@/lib/travellers/content';

import { type } from './look';
import { Asked, Heading } from './paper-parts';
import { counted } from './paper-words';

/** What each furnace load is run at, two beside each other, and why they may not be joined. */
export function TravellerLoads({ furnace }: { furnace: Loads }) {
  const { loads, apart, areSet } = furnace;
  const pairs = loads.flatMap((load, at) => (at % 2 === 0 ? [[load, loads[at + 1]] as const] : []));
  return (
    <View>
      {pairs.map((pair, at) => (
        <View key={at} wrap={false} style={{ flexDirection: 'row', marginTop: 8 }}>
          {pair.map((load, column) => (
            <View
              key={column}
              style={{ flexGrow: 1, flexBasis: 0, ...(column === 0 ? { marginRight: 15 } : {}) }}
            >
              {load && (
                <>
                  <Heading
                    title={`Load ${load.number}${areSet ? '' : ', as planned'}`}
                    note={`${linesWords(load.lines)}: ${counted(load.pieces, 'piece')}`}
                  />
                  {load.rows.map(({ name, says, rest }) => (
                    <Asked
                      key={`${name} ${says}`}
                      name={name}
                      says={says}
                      {...(rest ? { rest } : {})}
                      width={66}
                    />
                  ))}
                </>
              )}
            </View>
          ))}
        </View>
      ))}
      {apart.length > 0 && (
        <Text style={{ ...type.text, marginTop: 4 }}>
          <Text style={{ fontWeight: 600 }}>The loads may not be joined: </Text>
          {`${apart.join('; ')}.`}
        </Text>
      )}
    </View>
  );
}

/** How many pieces of each line are looked at. */
export function TravellerSamples({ samples }: { samples: NonNullable<TravellerContent['samples']> }) {
  return (
    <View style={{ marginTop: 8 }}>
      <Heading title="Samples" note="by the plan that the order states" />
      {samples.map(({ lineNo, inspect, pieces, says, plan }) => (
        <Asked
          key={lineNo}
          name={`Line ${lineNo}`}
          says={`${inspect} of ${pieces}, ${says}`}
          rest={plan}
          width={66}
        />
      ))}
    </View>
  );
}
