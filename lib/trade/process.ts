/** Outside processes a route can name. Plain words of the trade; the specification says the rest. */
export const PROCESSES = [
  'solution_heat_treat_and_age',
  'solution_heat_treat',
  'artificial_age',
  'anneal',
  'harden_and_temper',
  'stress_relief',
  'embrittlement_relief',
  'cadmium_plate',
  'zinc_plate',
  'nickel_plate',
  'chromium_plate',
  'anodize',
  'chemical_film',
  'passivation',
  'phosphate',
  'shot_peen',
  'fluorescent_penetrant',
  'magnetic_particle',
  'radiography',
  'ultrasonic',
] as const;
export type Process = (typeof PROCESSES)[number];

/** How a process is said on screens and papers. */
export const PROCESS_WORDS: Record<Process, string> = {
  solution_heat_treat_and_age: 'solution, quench and age',
  solution_heat_treat: 'solution and quench',
  artificial_age: 'artificial ageing',
  anneal: 'anneal',
  harden_and_temper: 'harden and temper',
  stress_relief: 'stress relief',
  embrittlement_relief: 'embrittlement relief bake',
  cadmium_plate: 'cadmium plate',
  zinc_plate: 'zinc plate',
  nickel_plate: 'nickel plate',
  chromium_plate: 'chromium plate',
  anodize: 'anodize',
  chemical_film: 'chemical film',
  passivation: 'passivation',
  phosphate: 'phosphate',
  shot_peen: 'shot peen',
  fluorescent_penetrant: 'fluorescent penetrant',
  magnetic_particle: 'magnetic particle',
  radiography: 'radiography',
  ultrasonic: 'ultrasonic',
};

export const PRODUCT_FORMS = ['sheet', 'plate', 'bar', 'tube', 'extrusion', 'forging', 'casting'] as const;
export type ProductForm = (typeof PRODUCT_FORMS)[number];
