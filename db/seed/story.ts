import { SMOOTH, type Campaign } from './campaign';
import { PAST } from './past';

const out = {
  ...SMOOTH,
  shippedAfter: undefined,
  receivedAfter: undefined,
  papersAfter: undefined,
  provedAfter: undefined,
  invoicedAfter: undefined,
  enteredAfter: undefined,
  paidAfter: undefined,
  releasedAfter: undefined,
};
type Plot = Campaign['steps'][number];
/** Fields that are undefined are left out: they did not happen. */
const plot = (given: { [K in keyof Plot]: Plot[K] | undefined }): Plot =>
  Object.fromEntries(Object.entries(given).filter(([, value]) => value !== undefined)) as unknown as Plot;

/** What is under way today: a batch in every stage, two late, one held, one called back, one with an invoice that does not match. */
const PRESENT: readonly Campaign[] = [
  // Late at the inspection house, and the spreader bars are already waiting.
  {
    startedDaysAgo: 33,
    parts: [
      ['MC-1130-10', 4],
      ['MC-1130-11', 8],
    ],
    steps: [plot({ ...out, wantedInDays: 18, promises: [12], acknowledgedAfter: 3 })],
  },
  // Late at the heat treater after a broken promise.
  {
    startedDaysAgo: 24,
    parts: [
      ['MC-1106-11', 14],
      ['MC-1106-12', 15],
      ['MC-1106-13', 12],
    ],
    steps: [
      plot({
        ...out,
        promises: [12, 17],
        question: { after: 9, body: 'Is the bend radius on the aft stiffener .09 or .06?' },
      }),
    ],
  },
  // Held: the bake began too late.
  {
    startedDaysAgo: 56,
    parts: [['MC-1134-05', 16]],
    steps: [
      SMOOTH,
      SMOOTH,
      plot({
        ...out,
        promises: [9],
        shippedAfter: 8,
        receivedAfter: 9,
        papersAfter: 9,
        states: { 'Bake start': '6.2 h after plating' },
        held: { after: 10, pieces: 16, what: 'Bake began 6 h 10 min after plating; the order says 4 h' },
      }),
    ],
  },
  // Papers in, to prove.
  {
    startedDaysAgo: 16,
    parts: [
      ['MC-1102-01', 4],
      ['MC-1102-02', 4],
      ['MC-1102-03', 4],
      ['MC-1102-04', 4],
    ],
    steps: [
      plot({ ...out, promises: [12], shippedAfter: 11, receivedAfter: 13, papersAfter: 13, soakedMin: 38 }),
    ],
  },
  // A certificate for 40 of 41 pieces, signed for 40.
  {
    startedDaysAgo: 19,
    parts: [['MC-1148-03', 41]],
    steps: [
      plot({
        ...out,
        promises: [11],
        shippedAfter: 11,
        receivedAfter: 13,
        papersAfter: 13,
        uncovered: 1,
        provedAfter: 15,
      }),
    ],
  },
  // Proved, and the invoice asks for a copy that nobody ordered.
  {
    startedDaysAgo: 21,
    parts: [['MC-3301-08', 20]],
    steps: [
      plot({
        ...out,
        promises: [12],
        shippedAfter: 11,
        receivedAfter: 13,
        papersAfter: 13,
        provedAfter: 15,
        invoicedAfter: 16,
        invoiceExtra: { description: 'Copy of certification', amountMinor: 2_500 },
        enteredAfter: 17,
      }),
    ],
  },
  // Paid, to release.
  {
    startedDaysAgo: 20,
    parts: [
      ['MC-1144-05', 6],
      ['MC-1144-06', 10],
    ],
    steps: [plot({ ...SMOOTH, releasedAfter: undefined })],
  },
  // In stock since yesterday.
  {
    startedDaysAgo: 17,
    parts: [
      ['MC-1140-08', 18],
      ['MC-3308-02', 12],
    ],
    steps: [plot({ ...SMOOTH, paidAfter: 15, releasedAfter: 15 })],
  },
  // At the processor, in time.
  { startedDaysAgo: 9, parts: [['MC-1134-09', 60]], steps: [plot({ ...out, promises: [15] })] },
  {
    startedDaysAgo: 11,
    parts: [
      ['MC-1120-01', 8],
      ['MC-1120-02', 8],
      ['MC-1120-07', 32],
    ],
    steps: [
      plot({
        ...out,
        promises: [18],
        question: {
          after: 8,
          body: 'Line 3: may we rack the retainers on the flange? It leaves a mark of 2 mm.',
        },
      }),
    ],
  },
  {
    startedDaysAgo: 27,
    parts: [
      ['MC-2201-01', 4],
      ['MC-2201-02', 4],
      ['MC-2201-03', 4],
    ],
    steps: [SMOOTH, plot({ ...out, promises: [17] })],
  },
  // Part of it is back.
  {
    startedDaysAgo: 30,
    parts: [
      ['MC-1140-01', 2],
      ['MC-1140-02', 2],
    ],
    steps: [SMOOTH, plot({ ...out, promises: [16], receivedAfter: 10, missing: 1 })],
  },
  // Sent, no date yet.
  {
    startedDaysAgo: 4,
    parts: [
      ['MC-1118-06', 48],
      ['MC-2220-03', 18],
    ],
    steps: [plot({ ...out, promises: [], acknowledgedAfter: 2 })],
  },
  // Called back the day after it left: the drawing changes first, and the cups wait again.
  {
    startedDaysAgo: 8,
    parts: [['MC-1150-01', 30]],
    steps: [
      plot({
        ...out,
        acknowledgedAfter: undefined,
        promises: [],
        cancelled: {
          after: 2,
          reason:
            'The bore of the cup changes with revision B of the drawing. Do not start; the van fetches them.',
        },
      }),
    ],
  },
  // Left yesterday, not acknowledged.
  {
    startedDaysAgo: 3,
    parts: [['MC-1144-01', 4]],
    steps: [plot({ ...out, acknowledgedAfter: undefined, promises: [], wantedInDays: 16 })],
  },
  // Being built: one should have left, one leaves the day after tomorrow.
  {
    startedDaysAgo: 5,
    parts: [
      ['MC-3301-01', 6],
      ['MC-3301-02', 48],
    ],
    steps: [plot({ ...out, leavesInDays: 3, dispatchedAfter: undefined, wantedInDays: 17 })],
  },
  {
    startedDaysAgo: 2,
    parts: [
      ['MC-2204-01', 4],
      ['MC-2204-02', 4],
    ],
    steps: [plot({ ...out, leavesInDays: 3, dispatchedAfter: undefined, wantedInDays: 16 })],
  },
  // Lots that wait for their first step.
  {
    startedDaysAgo: 2,
    parts: [
      ['MC-1114-21', 8],
      ['MC-1114-22', 12],
      ['MC-1110-01', 2],
      ['MC-2212-04', 4],
      ['MC-1150-01', 20],
      ['MC-2216-01', 4],
    ],
    steps: [],
  },
];

export const CAMPAIGNS: readonly Campaign[] = [...PAST, ...PRESENT];

/** The other yard sends to the same processors, and neither sees the other. */
export const OTHER_YARD: readonly Campaign[] = [
  { startedDaysAgo: 40, parts: [['LS-20-114', 30]], steps: [SMOOTH] },
  { startedDaysAgo: 13, parts: [['LS-20-114', 60]], steps: [plot({ ...out, promises: [16] })] },
  { startedDaysAgo: 6, parts: [['LS-31-002', 12]], steps: [plot({ ...out, promises: [14] })] },
];
