import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { fitsEquipment } from '@/lib/trade/envelope/fits-equipment';
import { fitsInPlan } from '@/lib/trade/envelope/fits-in-plan';
import { massOnHearth } from '@/lib/trade/envelope/mass-on-hearth';
import { sideBySide } from '@/lib/trade/envelope/side-by-side';
import { widestBlank } from '@/lib/trade/envelope/widest-blank';
import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';

import { numberOf, publishedRows, saidBy } from './values';

const size = fc.double({ min: 1, max: 3000, noNaN: true });
const rectangle = fc.record({ lengthMm: size, widthMm: size });
const inches = (length: number, width: number) => ({
  lengthMm: mmFromInches(length),
  widthMm: mmFromInches(width),
});

/** Another way to the same answer: the rectangle is turned step by step and its shadow measured. */
function fitsTurned(
  part: { lengthMm: number; widthMm: number },
  space: { lengthMm: number; widthMm: number },
) {
  const steps = 20_000;
  for (let step = 0; step <= steps; step++) {
    const angle = (Math.PI / 2) * (step / steps);
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const along = part.lengthMm * cos + part.widthMm * sin;
    const across = part.lengthMm * sin + part.widthMm * cos;
    if (along <= space.lengthMm + 1e-9 && across <= space.widthMm + 1e-9) return true;
  }
  return false;
}

describe('rectangle in rectangle', () => {
  test('50 × 4 fits 48 × 24 diagonally with 22.0062; 50 × 8 needs 30.2961 and does not', () => {
    const narrow = fitsInPlan({ lengthMm: 50, widthMm: 4 }, { lengthMm: 48, widthMm: 24 });
    expect(narrow).toMatchObject({ ok: true, fits: true, lies: 'diagonally' });
    expect(narrow.ok && narrow.neededWidthMm).toBeCloseTo(22.0062, 4);
    const wide = fitsInPlan({ lengthMm: 50, widthMm: 8 }, { lengthMm: 48, widthMm: 24 });
    expect(wide).toMatchObject({ ok: true, fits: false, lies: null });
  });

  const rows = publishedRows('rectangle-fit', [
    'p',
    'q',
    'a',
    'b',
    'fits',
    'b_needed_on_the_diagonal',
    'symmetric_form_value',
    'brute_force',
  ]);
  test.each(rows.map((row) => [`${row.p} × ${row.q} in ${row.a} × ${row.b}`, saidBy(row), row] as const))(
    '%s (%s)',
    (_name, _said, row) => {
      const part = { lengthMm: numberOf(row.p), widthMm: numberOf(row.q) };
      const space = { lengthMm: numberOf(row.a), widthMm: numberOf(row.b) };
      const laid = fitsInPlan(part, space);
      expect(laid).toMatchObject({ ok: true, fits: row.fits === 'yes' });
      expect(row.brute_force).toBe(row.fits);
      // The formula alone may ask for less than the part is wide; the answer never does.
      const needed = Math.max(numberOf(row.b_needed_on_the_diagonal), part.widthMm);
      expect(laid.ok && laid.neededWidthMm).toBeCloseTo(needed, 4);
    },
  );

  test('the trap of the formula alone: a 10 × 10 does not fit an 8 × 8', () => {
    expect(fitsInPlan({ lengthMm: 10, widthMm: 10 }, { lengthMm: 8, widthMm: 8 })).toMatchObject({
      ok: true,
      fits: false,
      lies: null,
      neededWidthMm: 10,
    });
  });

  test('the trap of the symmetric form: a square part divides nothing by zero', () => {
    fc.assert(
      fc.property(size, rectangle, (side, space) => {
        const laid = fitsInPlan({ lengthMm: side, widthMm: side }, space);
        return (
          laid.ok &&
          Number.isFinite(laid.neededWidthMm) &&
          laid.fits === side <= Math.min(space.lengthMm, space.widthMm) + 1e-9
        );
      }),
    );
  });

  test('turning the rectangle step by step finds a place only where the condition does', () => {
    fc.assert(
      fc.property(rectangle, rectangle, (part, space) => {
        const laid = fitsInPlan(part, space);
        if (!laid.ok) return false;
        if (fitsTurned(part, space)) return laid.fits;
        // Steps may miss a place that is only just wide enough.
        const shorter = Math.min(space.lengthMm, space.widthMm);
        return (
          !laid.fits ||
          shorter - laid.neededWidthMm < 0.002 * Math.max(space.lengthMm, part.lengthMm, part.widthMm)
        );
      }),
      { numRuns: 150 },
    );
  });

  test('which side is called the length does not matter, and a smaller part fits where a larger does', () => {
    fc.assert(
      fc.property(
        rectangle,
        rectangle,
        fc.double({ min: 0.1, max: 1, noNaN: true }),
        (part, space, share) => {
          const laid = fitsInPlan(part, space);
          const turned = fitsInPlan({ lengthMm: part.widthMm, widthMm: part.lengthMm }, space);
          const smaller = fitsInPlan(
            { lengthMm: part.lengthMm * share, widthMm: part.widthMm * share },
            space,
          );
          return (
            laid.ok && turned.ok && smaller.ok && laid.fits === turned.fits && (!laid.fits || smaller.fits)
          );
        },
      ),
    );
  });

  test.each([0, -1, NaN, Infinity])('a side of %f is refused', (lengthMm) => {
    expect(fitsInPlan({ lengthMm, widthMm: 1 }, { lengthMm: 2, widthMm: 2 })).toEqual({
      ok: false,
      reason: 'size_not_positive',
    });
  });
});

describe('how wide a blank may be', () => {
  const SHEET = inches(144, 48);

  test('147 in on a 144 × 48 in sheet (common practice, no source): not straight, diagonally up to 8.897 in', () => {
    const widest = widestBlank(mmFromInches(147), SHEET);
    if (!widest.ok) throw new Error(widest.reason);
    expect(widest.lies).toBe('diagonally');
    expect(inchesFromMm(widest.widthMm)).toBeCloseTo(8.897, 3);
    expect(fitsTurned(inches(147, 8.89), SHEET)).toBe(true);
    expect(fitsTurned(inches(147, 8.9), SHEET)).toBe(false);
  });

  test('a blank of that width fits, a hair wider does not, and longer is never wider', () => {
    fc.assert(
      fc.property(size, size, rectangle, (one, other, space) => {
        const short = widestBlank(Math.min(one, other), space);
        const long = widestBlank(Math.max(one, other), space);
        if (!short.ok) return short.reason === 'longer_than_diagonal' && !long.ok;
        const lengthMm = Math.min(one, other);
        const fits = fitsInPlan({ lengthMm, widthMm: short.widthMm }, space);
        const wider = fitsInPlan({ lengthMm, widthMm: short.widthMm * (1 + 1e-6) + 1e-6 }, space);
        const limited = short.widthMm * 1.0001 < lengthMm;
        const neverWider = !long.ok || short.lies === 'straight' || long.widthMm <= short.widthMm + 1e-9;
        return fits.ok && fits.fits && wider.ok && (!limited || !wider.fits) && neverWider;
      }),
    );
  });

  test('a wire as long as the diagonal is the limit', () => {
    expect(widestBlank(50.001, { lengthMm: 40, widthMm: 30 })).toMatchObject({
      ok: false,
      reason: 'longer_than_diagonal',
    });
    expect(widestBlank(49.9, { lengthMm: 40, widthMm: 30 })).toMatchObject({ ok: true, lies: 'diagonally' });
    expect(widestBlank(0, SHEET)).toMatchObject({ ok: false, reason: 'size_not_positive' });
  });
});

describe('a part in a furnace or tank', () => {
  const ROOM = { lengthMm: 1220, widthMm: 610, heightMm: 600 };
  const part = (lengthMm: number, widthMm: number, heightMm: number) => ({ lengthMm, widthMm, heightMm });
  const AS_IT_IS = { clearanceMm: 0, turning: 'none' } as const;

  test('1270 × 102 × 50 mm in 1220 × 610 × 600 mm fits diagonally; 203 mm wide only when it may be turned', () => {
    expect(fitsEquipment(part(1270, 102, 50), ROOM, AS_IT_IS)).toMatchObject({
      fits: true,
      upright: 'height',
      lies: 'diagonally',
    });
    expect(fitsEquipment(part(1270, 203, 50), ROOM, AS_IT_IS)).toMatchObject({
      fits: false,
      because: 'too_large_in_plan',
    });
    expect(fitsEquipment(part(1270, 203, 50), ROOM, { clearanceMm: 0, turning: 'any' })).toMatchObject({
      fits: true,
      upright: 'width',
      lies: 'diagonally',
    });
  });

  test('height decides too, and clearance counts', () => {
    expect(fitsEquipment(part(500, 500, 601), ROOM, AS_IT_IS)).toMatchObject({
      fits: false,
      because: 'too_high',
    });
    expect(fitsEquipment(part(500, 500, 600), ROOM, AS_IT_IS)).toMatchObject({
      fits: true,
      lies: 'straight',
    });
    expect(fitsEquipment(part(500, 500, 600), ROOM, { clearanceMm: 1, turning: 'none' })).toMatchObject({
      fits: false,
    });
    expect(fitsEquipment(part(1200, 590, 90), ROOM, { clearanceMm: 10, turning: 'none' })).toMatchObject({
      fits: true,
    });
    expect(fitsEquipment(part(1201, 590, 90), ROOM, { clearanceMm: 10, turning: 'none' })).toMatchObject({
      fits: false,
    });
  });

  test('what is no size and no clearance is refused; a room of nothing but clearance holds nothing', () => {
    expect(fitsEquipment(part(0, 1, 1), ROOM, AS_IT_IS)).toMatchObject({ reason: 'size_not_positive' });
    expect(fitsEquipment(part(1, 1, 1), ROOM, { clearanceMm: -1, turning: 'any' })).toMatchObject({
      reason: 'clearance_negative',
    });
    expect(fitsEquipment(part(1, 1, 1), ROOM, { clearanceMm: 400, turning: 'any' })).toMatchObject({
      ok: true,
      fits: false,
    });
  });

  test('what fits as it is also fits where it may be turned', () => {
    const box = fc.record({ lengthMm: size, widthMm: size, heightMm: size });
    fc.assert(
      fc.property(box, box, (one, room) => {
        const asItIs = fitsEquipment(one, room, AS_IT_IS);
        const turned = fitsEquipment(one, room, { clearanceMm: 0, turning: 'any' });
        return asItIs.ok && turned.ok && (!asItIs.fits || turned.fits);
      }),
    );
  });
});

describe('side by side, and the mass on the hearth', () => {
  test('300 × 200 mm with 20 mm between them in 1200 × 600 mm: 6, in 2 rows of 3', () => {
    expect(sideBySide({ lengthMm: 300, widthMm: 200 }, { lengthMm: 1200, widthMm: 600 }, 20)).toMatchObject({
      ok: true,
      pieces: 6,
      rows: 2,
      inRow: 3,
    });
  });

  test('three pieces of 4 in lie in exactly 12 in', () => {
    expect(sideBySide(inches(4, 4), inches(12, 4), 0)).toMatchObject({ ok: true, pieces: 3 });
  });

  test('never more than the area holds, and fewer with more room between them', () => {
    fc.assert(
      fc.property(rectangle, rectangle, fc.double({ min: 0, max: 50, noNaN: true }), (part, space, gap) => {
        const tight = sideBySide(part, space, 0);
        const loose = sideBySide(part, space, gap);
        const holds = (space.lengthMm * space.widthMm) / (part.lengthMm * part.widthMm);
        return tight.ok && loose.ok && tight.pieces <= holds + 1e-6 && loose.pieces <= tight.pieces;
      }),
    );
  });

  test('refusals', () => {
    expect(sideBySide({ lengthMm: 0, widthMm: 1 }, inches(1, 1), 0)).toMatchObject({
      reason: 'size_not_positive',
    });
    expect(sideBySide(inches(1, 1), inches(1, 1), -1)).toMatchObject({ reason: 'gap_negative' });
    expect(massOnHearth([{ massKg: 1, pieces: 1.5 }], 10)).toMatchObject({ reason: 'pieces_not_whole' });
    expect(massOnHearth([{ massKg: 0, pieces: 1 }], 10)).toMatchObject({ reason: 'mass_not_positive' });
    expect(massOnHearth([], 0)).toMatchObject({ reason: 'limit_not_positive' });
  });

  test('40 pieces of 2.5 kg and a basket of 30 kg on 150 kg: 130 kg, 20 kg left; one piece of 21 kg is too much', () => {
    const load = [
      { massKg: 2.5, pieces: 40 },
      { massKg: 30, pieces: 1 },
    ];
    expect(massOnHearth(load, 150)).toMatchObject({ ok: true, totalKg: 130, leftKg: 20, within: true });
    expect(massOnHearth([...load, { massKg: 21, pieces: 1 }], 150)).toMatchObject({
      leftKg: -1,
      within: false,
    });
  });
});
