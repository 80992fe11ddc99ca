/** Copper of the international standard of 1913, 100 % IACS, in megasiemens per metre. Exact by its definition. */
const MS_PER_M_OF_STANDARD_COPPER = 58;

/** Conductivity in % IACS to MS/m, exact: 30 % IACS is 17.4 MS/m. */
export const msPerMFromIacs = (percentIacs: number): number =>
  (percentIacs / 100) * MS_PER_M_OF_STANDARD_COPPER;

/** Conductivity in MS/m to % IACS, exact: 17.4 MS/m is 30 % IACS. */
export const iacsFromMsPerM = (msPerM: number): number => (msPerM / MS_PER_M_OF_STANDARD_COPPER) * 100;
