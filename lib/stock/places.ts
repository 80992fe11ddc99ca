/** Every place a piece can be in. The holder says which one: see the comment of each. */
export const PLACES = [
  'making', // holder: the outside step of the route it waits for
  'packed', // holder: the batch line, from here to hold
  'transit_out',
  'at_processor',
  'transit_back',
  'quarantine',
  'hold', // holder: the nonconformance
  'stock', // holder: the stock location
  'fitted', // holder: the assembly
  'scrapped', // no holder
  'lost', // no holder
] as const;
export type Place = (typeof PLACES)[number];

/** Places in which a piece is out of the shop's hands. */
export const AWAY_PLACES = [
  'transit_out',
  'at_processor',
  'transit_back',
] as const satisfies readonly Place[];
