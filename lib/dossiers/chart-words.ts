import type { DossierChart } from './content';

const VERDICTS: Record<DossierChart['verdict'], string> = {
  pass: 'shows what was asked',
  fail: 'does not show what was asked',
  review: 'has to be looked at by a person',
};

/** `Furnace chart load-a.csv: shows what was asked` */
export const chartWords = ({ fileName, verdict }: Pick<DossierChart, 'fileName' | 'verdict'>): string =>
  `Furnace chart ${fileName}: ${VERDICTS[verdict]}`;

/** `Read by machine against 920 ± 10 °F, soak 35 min or more.` */
export function againstWords({
  requirement,
  corrections,
}: Pick<DossierChart, 'requirement' | 'corrections'>): string {
  const { set, tolerance, unit, soakMinutes, soakMinutesMax, maxQuenchDelayS, maxOvershoot } = requirement;
  const asked = [
    `${set} ± ${tolerance} °${unit}`,
    soakMinutes !== undefined && `soak ${soakMinutes} min or more`,
    soakMinutesMax !== undefined && `soak ${soakMinutesMax} min or less`,
    maxQuenchDelayS !== undefined && `quench delay ${maxQuenchDelayS} s or less`,
    maxOvershoot !== undefined && `${maxOvershoot} °${unit} over the limit allowed`,
  ].filter(Boolean);
  const byHand = Object.keys(corrections).length > 0 ? ', as a person said it is to be understood' : '';
  return `Read by machine against ${asked.join(', ')}${byHand}.`;
}
