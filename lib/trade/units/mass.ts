/** Exact by definition of the pound. */
export const KG_PER_POUND = 0.45359237;

/** Pounds to kilograms, exact: 1 lb is 0.45359237 kg. */
export const kgFromPounds = (pounds: number): number => pounds * KG_PER_POUND;

/** Kilograms to pounds, exact: 0.45359237 kg is 1 lb. */
export const poundsFromKg = (kg: number): number => kg / KG_PER_POUND;
