import { describe, expect, test } from 'vitest';

import { familyOf, type Alloy } from '@/lib/trade/alloys/alloy';
import { cautionsFor } from '@/lib/trade/cautions/cautions-for';
import { PROCESSES } from '@/lib/trade/process';
import { CAUTIONS } from '@/lib/trade/tables/cautions';

import { publishedRows, saidBy } from './values';

/** One alloy of each family that the values name. */
const SAMPLES: readonly Alloy[] = ['2024', 'AZ31B', '4130', '17-4PH', '304', 'Ti-6Al-4V'];
const FAMILIES = SAMPLES.map(familyOf);

describe('cautions', () => {
  const rows = publishedRows('cautions', ['process', 'family', 'tells']);
  test.each(rows.map((row) => [row.process, row.tells, saidBy(row), row] as const))(
    '%s: %s (%s)',
    (_process, _tells, _said, row) => {
      const process = PROCESSES.find((one) => one === row.process);
      if (!process) throw new Error(row.process);
      const found = cautionsFor(CAUTIONS, {
        process,
        families: FAMILIES.filter((one) => one === row.family),
        papers: false,
      });
      const tells = row.tells.split(';');
      const one = found.find(({ says }) => tells.every((words) => says.includes(words)));
      expect(one?.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
    },
  );

  test('cadmium plating of steel on papers: hold for the bake, and the fumes; of bronze no bake', () => {
    const says = (families: typeof FAMILIES) =>
      cautionsFor(CAUTIONS, { process: 'cadmium_plate', families, papers: true })
        .map((one) => one.says)
        .join('\n');
    expect(says(['low_alloy_steel'])).toContain('until the bake is proved');
    expect(says(['low_alloy_steel'])).toContain('Cadmium fumes');
    expect(says(['copper_alloy'])).not.toContain('bake');
  });

  test('magnesium is warned of only where magnesium is in the load', () => {
    const says = (families: typeof FAMILIES) =>
      cautionsFor(CAUTIONS, { process: 'solution_heat_treat', families, papers: true }).some((one) =>
        one.says.startsWith('Magnesium'),
      );
    expect(says(['wrought_aluminium'])).toBe(false);
    expect(says(['wrought_aluminium', 'magnesium'])).toBe(true);
  });

  test('papers hold fewer than the reference, and something with every process', () => {
    for (const process of PROCESSES) {
      const asked = { process, families: FAMILIES };
      const papers = cautionsFor(CAUTIONS, { ...asked, papers: true });
      const all = cautionsFor(CAUTIONS, { ...asked, papers: false });
      expect(papers.length).toBeGreaterThanOrEqual(3);
      expect(all).toEqual(expect.arrayContaining(papers));
      expect(new Set(all.map(({ says }) => says)).size).toBe(all.length);
    }
  });
});
