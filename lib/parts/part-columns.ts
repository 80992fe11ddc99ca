import type { parts } from '@/db/schema/parts';

import type { PartInput } from './contract';
import { readMeasure, type Quantity } from './measure';

type Columns = Omit<typeof parts.$inferInsert, 'id' | 'shopId' | 'createdAt' | 'supersededAt' | 'version'>;

/** What a person typed as the columns keep it: measures in SI beside the words, nothing where nothing was typed. */
export function partColumns(input: PartInput): Columns {
  const [thicknessMm, thicknessEntered] = measured(input.thickness, 'length');
  const [lengthMm, lengthEntered] = measured(input.length, 'length');
  const [widthMm, widthEntered] = measured(input.width, 'length');
  const [heightMm, heightEntered] = measured(input.height, 'length');
  const [massG, massEntered] = measured(input.mass, 'mass');
  const [areaMm2, areaEntered] = measured(input.area, 'area');
  return {
    number: input.number,
    revision: input.revision,
    name: input.name,
    alloy: input.alloy,
    form: input.form,
    clad: input.clad,
    madeCondition: input.madeCondition,
    endCondition: input.endCondition,
    serialised: input.serialised,
    note: orNull(input.note),
    drawingFileId: input.drawingFileId,
    ...{
      thicknessMm,
      thicknessEntered,
      lengthMm,
      lengthEntered,
      widthMm,
      widthEntered,
      heightMm,
      heightEntered,
      massG,
      massEntered,
      areaMm2,
      areaEntered,
    },
  };
}

/** The contract has read it before; here it cannot fail. */
function measured(typed: string, quantity: Quantity): [number | null, string | null] {
  const read = typed === '' ? null : readMeasure(typed, quantity, 'It');
  return read?.ok ? [read.value, read.entered] : [null, null];
}

export const orNull = (text: string): string | null => (text === '' ? null : text);
