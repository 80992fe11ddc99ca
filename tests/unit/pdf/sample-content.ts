import type { OrderContent, TravellerContent } from '@/lib/travellers/content';

const line = (
  lineNo: number,
  pieces: number,
  given: Partial<TravellerContent['lines'][number]> = {},
): TravellerContent['lines'][number] => ({
  lineNo,
  pieces,
  loadNo: null,
  lotNumber: `L-0${230 + lineNo}`,
  partNumber: `FL-44${10 + lineNo}-03`,
  partRevision: 'C',
  partName: 'Bulkhead web, sta 62',
  material: '2024 clad sheet',
  thickness: '0.032 in',
  heat: '77-3041',
  conditionBefore: 'O',
  targetCondition: 'T42',
  stepNote: null,
  serials: [],
  ...given,
});

/** A traveller as it is stated at dispatch; invented through and through. */
export function sampleTraveller(given: Partial<TravellerContent> = {}, lineCount = 5): TravellerContent {
  const lines = Array.from({ length: lineCount }, (_, at) =>
    line(
      at + 1,
      [14, 10, 22, 6, 8][at % 5] ?? 1,
      at === 3
        ? { stepNote: 'Rack on edge', loadNo: 2, thickness: '0.125 in' }
        : { loadNo: at === 4 ? 2 : 1 },
    ),
  );
  return {
    kind: 'traveller',
    documentVersion: 1,
    paper: 'letter',
    number: 'B-0419',
    orderNumber: 'TS-1187',
    zone: 'America/Vancouver',
    statedAt: '2026-04-17T14:12:00.000Z',
    statedBy: 'Ines Halloran',
    dispatchedAt: '2026-04-17T14:12:00.000Z',
    wantedBackOn: '2026-04-30',
    shop: { name: 'Tern Slip Floatworks', address: ['Slip 4', 'Tern Harbor'], phone: '555 0117' },
    processor: {
      name: 'Ostrow Heat Treating',
      address: ['2210 Millrace Road', 'Dunmore Falls'],
      phone: null,
    },
    process: 'solution_heat_treat_and_age',
    specification: 'AMS 2770R',
    note: 'Yard van, call the day before.',
    changes: [],
    lines,
    requirements: [
      { lines: [], characteristic: 'Final condition', limit: 'T42, written so', unit: '', source: 'drawing' },
      {
        lines: [1, 2, 3],
        characteristic: 'Hardness',
        limit: '63 to 83',
        unit: 'HRB, 3 of each line',
        source: 'AMS 2658',
      },
      {
        lines: [4, 5],
        characteristic: 'Conductivity',
        limit: '28.5 to 34.0',
        unit: '% IACS',
        source: 'AMS 2658',
      },
      {
        lines: [],
        characteristic: 'Furnace chart',
        limit: 'of each load, all couples',
        unit: '',
        source: 'shop',
      },
    ],
    cautions: [
      'Only the work asked here, to the specification at the revision named.',
      'If anything here and the order differ, stop and call.',
    ],
    overrides: [],
    link: { base: 'https://lotwright.test/b/', linkId: '0197a000-0000-7000-8000-000000000001' },
    ...given,
  };
}

export function sampleOrder(given: Partial<OrderContent> = {}): OrderContent {
  const {
    kind: _kind,
    cautions: _cautions,
    overrides: _overrides,
    link: _link,
    lines,
    ...stated
  } = sampleTraveller();
  return {
    ...stated,
    kind: 'purchase_order',
    currency: 'USD',
    lotMinimumMinor: 18000,
    certificationFeeMinor: 2500,
    lines: lines.map((one) => ({ ...one, unitPriceMinor: 245 })),
    ...given,
  };
}
