/** What each airframe on the yard's slips still needs, by the day it is needed (days from today). */
export const ASSEMBLIES: readonly {
  name: string;
  neededInDays: number;
  needs: readonly (readonly [partNumber: string, pieces: number])[];
}[] = [
  {
    name: 'Spreader bars 31',
    neededInDays: -4,
    needs: [
      ['MC-1130-10', 4],
      ['MC-1130-11', 8],
      ['MC-1130-14', 4],
    ],
  },
  {
    name: 'Left float 31',
    neededInDays: 6,
    needs: [
      ['MC-1102-01', 2],
      ['MC-1102-02', 2],
      ['MC-1102-03', 2],
      ['MC-1106-11', 12],
      ['MC-1106-12', 12],
      ['MC-1106-13', 12],
      ['MC-1118-06', 40],
    ],
  },
  {
    name: 'Right float 31',
    neededInDays: 12,
    needs: [
      ['MC-1102-01', 2],
      ['MC-1102-02', 2],
      ['MC-1102-04', 2],
      ['MC-1110-01', 2],
      ['MC-1110-02', 2],
      ['MC-1114-21', 8],
    ],
  },
  {
    name: 'Float struts 31',
    neededInDays: 15,
    needs: [
      ['MC-1134-01', 4],
      ['MC-1134-02', 4],
      ['MC-1134-05', 16],
      ['MC-1134-09', 24],
      ['MC-1140-01', 2],
      ['MC-1140-02', 2],
    ],
  },
  {
    name: 'Water rudders 31',
    neededInDays: 20,
    needs: [
      ['MC-1144-01', 2],
      ['MC-1144-02', 2],
      ['MC-1144-05', 4],
      ['MC-1144-06', 8],
    ],
  },
  {
    name: 'Left wing 32',
    neededInDays: 27,
    needs: [
      ['MC-2201-01', 4],
      ['MC-2201-02', 4],
      ['MC-2201-03', 4],
      ['MC-2204-01', 2],
      ['MC-2208-12', 6],
      ['MC-2220-03', 18],
    ],
  },
  {
    name: 'Hatches 31 and 32',
    neededInDays: 34,
    needs: [
      ['MC-1120-01', 8],
      ['MC-1120-02', 8],
      ['MC-1120-07', 32],
    ],
  },
  {
    name: 'Cabin floor 32',
    neededInDays: 41,
    needs: [
      ['MC-3301-01', 6],
      ['MC-3301-02', 48],
      ['MC-3301-08', 20],
    ],
  },
];
