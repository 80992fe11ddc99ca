/** What kind of metal a material is, so far as rules ask for it. */
export type AlloyFamily =
  | 'wrought_aluminium'
  | 'cast_aluminium'
  | 'magnesium'
  | 'titanium'
  | 'low_alloy_steel'
  | 'precipitation_hardening_steel'
  | 'austenitic_stainless'
  | 'nickel_alloy'
  | 'copper_alloy'
  | 'plating';

/** The materials that the tables know by name, as they are written today. */
export const ALLOYS = {
  '1100': 'wrought_aluminium',
  '2014': 'wrought_aluminium',
  '2017': 'wrought_aluminium',
  '2024': 'wrought_aluminium',
  '2117': 'wrought_aluminium',
  '2219': 'wrought_aluminium',
  '3003': 'wrought_aluminium',
  '5052': 'wrought_aluminium',
  '5056': 'wrought_aluminium',
  '5083': 'wrought_aluminium',
  '6013': 'wrought_aluminium',
  '6061': 'wrought_aluminium',
  '6063': 'wrought_aluminium',
  '7050': 'wrought_aluminium',
  '7075': 'wrought_aluminium',
  '7178': 'wrought_aluminium',
  '7475': 'wrought_aluminium',
  'pure aluminium': 'wrought_aluminium',
  A356: 'cast_aluminium',
  '357': 'cast_aluminium',
  AZ31B: 'magnesium',
  AZ91: 'magnesium',
  'Ti CP': 'titanium',
  'Ti-6Al-4V': 'titanium',
  '4130': 'low_alloy_steel',
  '4340': 'low_alloy_steel',
  '300M': 'low_alloy_steel',
  '15-5PH': 'precipitation_hardening_steel',
  '17-4PH': 'precipitation_hardening_steel',
  '17-7PH': 'precipitation_hardening_steel',
  '304': 'austenitic_stainless',
  '316': 'austenitic_stainless',
  '321': 'austenitic_stainless',
  '347': 'austenitic_stainless',
  'A-286': 'nickel_alloy',
  'Inconel 625': 'nickel_alloy',
  'Inconel 718': 'nickel_alloy',
  'Monel 400': 'nickel_alloy',
  copper: 'copper_alloy',
  'beryllium copper': 'copper_alloy',
  'cartridge brass': 'copper_alloy',
  'aluminium bronze': 'copper_alloy',
  cadmium: 'plating',
  nickel: 'plating',
  chromium: 'plating',
  zinc: 'plating',
} as const satisfies Record<string, AlloyFamily>;

export type Alloy = keyof typeof ALLOYS;

export const familyOf = (alloy: Alloy): AlloyFamily => ALLOYS[alloy];
