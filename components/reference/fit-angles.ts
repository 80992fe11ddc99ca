export interface Sides {
  lengthMm: number;
  widthMm: number;
}

/** What a rectangle needs along and across when it lies at an angle, in mm; the angle in radians from its long side. */
export function neededAt({ lengthMm, widthMm }: Sides, angle: number): { along: number; across: number } {
  const [p, q] = [Math.max(lengthMm, widthMm), Math.min(lengthMm, widthMm)];
  return {
    along: p * Math.cos(angle) + q * Math.sin(angle),
    across: p * Math.sin(angle) + q * Math.cos(angle),
  };
}

const STEPS = 3600;

/** The angles at which it fits, in degrees; null where there is none. Looked for in steps of a fortieth of a degree. */
export function fittingAngles(blank: Sides, inside: Sides): { from: number; to: number } | null {
  const [a, b] = [Math.max(inside.lengthMm, inside.widthMm), Math.min(inside.lengthMm, inside.widthMm)];
  const fits = Array.from({ length: STEPS + 1 }, (_, step) => (90 * step) / STEPS).filter((degrees) => {
    const { along, across } = neededAt(blank, radians(degrees));
    return along <= a && across <= b;
  });
  const [from, to] = [fits[0], fits.at(-1)];
  return from === undefined || to === undefined ? null : { from, to };
}

export const radians = (degrees: number): number => (degrees * Math.PI) / 180;
