type Words = Readonly<Record<string, string>>;

/** What houses call a process; no two alike. */
export const PROCESS_NAMES: Readonly<Record<'shop' | 'formal' | 'done' | 'plain', Words>> = {
  shop: {
    solution_heat_treat_and_age: 'SOLUTION HT TREAT & AGE',
    harden_and_temper: 'HARDEN & TEMPER',
    stress_relief: 'STRESS RELIEVE',
    cadmium_plate: 'CAD PLATE',
    zinc_plate: 'ZINC PLATE',
    anodize: 'SULFURIC ANODIZE',
    chemical_film: 'CHEM FILM',
    passivation: 'PASSIVATE',
    fluorescent_penetrant: 'FPI',
    magnetic_particle: 'MAG PARTICLE INSPECT',
  },
  formal: {
    solution_heat_treat_and_age: 'Solution Treatment and Ageing',
    harden_and_temper: 'Hardening and Tempering',
    stress_relief: 'Stress Relieving',
    cadmium_plate: 'Cadmium Plating',
    zinc_plate: 'Electroplated Zinc',
    anodize: 'Sulphuric Acid Anodising',
    chemical_film: 'Chromate Conversion Coating',
    passivation: 'Passivation',
    fluorescent_penetrant: 'Fluorescent Penetrant Inspection',
    magnetic_particle: 'Magnetic Particle Inspection',
  },
  done: {
    solution_heat_treat_and_age: 'solution heat treated, quenched and aged',
    harden_and_temper: 'hardened and tempered',
    stress_relief: 'stress relieved',
    cadmium_plate: 'cadmium plated',
    zinc_plate: 'zinc plated',
    anodize: 'anodized',
    chemical_film: 'chemical film treated',
    passivation: 'passivated',
    fluorescent_penetrant: 'fluorescent penetrant inspected',
    magnetic_particle: 'magnetic particle inspected',
  },
  plain: {
    solution_heat_treat_and_age: 'Solution & Age',
    harden_and_temper: 'Quench & Temper',
    stress_relief: 'Stress Relief',
    cadmium_plate: 'Cadmium',
    zinc_plate: 'Zinc',
    anodize: 'Anodize',
    chemical_film: 'Conversion Coat',
    passivation: 'Passivate',
    fluorescent_penetrant: 'Penetrant (FPI)',
    magnetic_particle: 'Mag. Particle (MT)',
  },
};

export const STEP_NAMES: Readonly<Record<'shop' | 'formal' | 'done' | 'short', Words>> = {
  shop: {
    solution: 'SOLUTION HEAT TREAT',
    natural_age: 'NATURAL AGE',
    artificial_age: 'AGE',
    austenitize: 'HARDEN',
    temper: 'TEMPER',
    stress_relief: 'STRESS RELIEVE',
    embrittlement_relief: 'BAKE',
  },
  formal: {
    solution: 'Solution treatment',
    natural_age: 'Natural ageing',
    artificial_age: 'Precipitation treatment',
    austenitize: 'Hardening (austenitise)',
    temper: 'Tempering',
    stress_relief: 'Stress relieving',
    embrittlement_relief: 'De-embrittlement',
  },
  done: {
    solution: 'solution treated',
    natural_age: 'naturally aged',
    artificial_age: 'precipitation hardened',
    austenitize: 'austenitized',
    temper: 'tempered',
    stress_relief: 'stress relieved',
    embrittlement_relief: 'baked for embrittlement relief',
  },
  short: {
    solution: 'Sol. treat',
    natural_age: 'Nat. age',
    artificial_age: 'Art. age',
    austenitize: 'Aust.',
    temper: 'Temper',
    stress_relief: 'S/R',
    embrittlement_relief: 'H.E. bake',
  },
};

export const READING_NAMES: Readonly<Record<'shop' | 'formal', Words>> = {
  shop: {
    hardness: 'HARDNESS',
    conductivity: 'CONDUCTIVITY',
    thickness: 'PLATE THICKNESS',
    tensile: 'ULT. TENSILE',
  },
  formal: {
    hardness: 'Hardness',
    conductivity: 'Electrical conductivity',
    thickness: 'Deposit thickness',
    tensile: 'Ultimate tensile strength',
  },
};
