import { SMOOTH, type Campaign } from './campaign';

const smooth = (steps: number): Campaign['steps'] => Array.from({ length: steps }, () => SMOOTH);
const rough = {
  ...SMOOTH,
  promises: [11, 15],
  shippedAfter: 14,
  receivedAfter: 15,
  papersAfter: 15,
  provedAfter: 16,
  invoicedAfter: 16,
  enteredAfter: 16,
  paidAfter: 16,
  releasedAfter: 17,
};

/** A year that went well, mostly: what is in stock and fitted today came from here. */
export const PAST: readonly Campaign[] = [
  {
    startedDaysAgo: 352,
    parts: [
      ['MC-1118-05', 12],
      ['MC-3301-01', 6],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 338,
    parts: [
      ['MC-1130-10', 4],
      ['MC-1130-11', 8],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 325,
    parts: [
      ['MC-1106-11', 20],
      ['MC-1106-12', 20],
      ['MC-1106-13', 14],
    ],
    steps: [rough],
  },
  {
    startedDaysAgo: 311,
    parts: [
      ['MC-1134-05', 16],
      ['MC-1134-06', 16],
    ],
    steps: smooth(3),
  },
  {
    startedDaysAgo: 298,
    parts: [
      ['MC-1120-01', 6],
      ['MC-1120-02', 6],
      ['MC-1120-07', 24],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 284,
    parts: [
      ['MC-1144-05', 6],
      ['MC-1148-01', 8],
    ],
    steps: smooth(3),
  },
  {
    startedDaysAgo: 270,
    parts: [
      ['MC-1140-08', 24],
      ['MC-1144-02', 4],
      ['MC-3308-01', 10],
    ],
    steps: smooth(1),
  },
  {
    startedDaysAgo: 255,
    parts: [
      ['MC-1102-01', 4],
      ['MC-1102-02', 4],
      ['MC-1102-04', 4],
    ],
    steps: [SMOOTH, rough],
  },
  {
    startedDaysAgo: 241,
    parts: [
      ['MC-1148-03', 16],
      ['MC-3312-05', 12],
    ],
    steps: smooth(1),
  },
  {
    startedDaysAgo: 226,
    parts: [
      ['MC-1134-01', 4],
      ['MC-1134-02', 4],
    ],
    steps: smooth(4),
  },
  {
    startedDaysAgo: 212,
    parts: [
      ['MC-2201-01', 4],
      ['MC-2201-02', 4],
      ['MC-2201-09', 8],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 198,
    parts: [
      ['MC-1124-03', 6],
      ['MC-1144-01', 2],
    ],
    steps: smooth(1),
  },
  {
    startedDaysAgo: 183,
    parts: [
      ['MC-3304-01', 4],
      ['MC-3304-02', 4],
      ['MC-2208-11', 8],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 169,
    parts: [
      ['MC-2216-01', 4],
      ['MC-2216-02', 8],
    ],
    steps: smooth(3),
  },
  {
    startedDaysAgo: 150,
    parts: [
      ['MC-1114-22', 30],
      ['MC-2220-03', 12],
    ],
    steps: [rough],
  },
  {
    startedDaysAgo: 136,
    parts: [
      ['MC-1130-14', 8],
      ['MC-2212-04', 4],
    ],
    steps: smooth(1),
  },
  {
    startedDaysAgo: 121,
    parts: [
      ['MC-4401-01', 4],
      ['MC-2208-12', 6],
      ['MC-2212-01', 4],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 104,
    parts: [
      ['MC-1110-01', 4],
      ['MC-1110-02', 4],
    ],
    steps: smooth(2),
  },
  {
    startedDaysAgo: 92,
    parts: [
      ['MC-1140-01', 2],
      ['MC-1140-02', 2],
      ['MC-4404-01', 2],
    ],
    steps: smooth(2),
  },
  { startedDaysAgo: 78, parts: [['MC-1118-06', 24]], steps: smooth(1) },
  {
    startedDaysAgo: 61,
    parts: [
      ['MC-1150-02', 20],
      ['MC-1120-07', 20],
    ],
    steps: smooth(2),
  },
];
