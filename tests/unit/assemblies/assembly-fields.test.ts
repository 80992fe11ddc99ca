import { expect, test } from 'vitest';

import {
  AssemblyFields,
  atFormRow,
  fieldsOf,
  sentOf,
  type AssemblyFieldsIn,
} from '@/components/assemblies/assembly-fields';

const typed = (needs: AssemblyFieldsIn['needs'], part: Partial<AssemblyFieldsIn> = {}): AssemblyFieldsIn => ({
  name: 'Left float 31',
  neededOn: '',
  note: '',
  needs,
  ...part,
});
const faultsOf = (form: AssemblyFieldsIn) =>
  AssemblyFields.safeParse(form).error?.issues.map((issue) => issue.path.join('.')) ?? [];

test('what is left empty is nothing, and an empty row is no fault', () => {
  const read = AssemblyFields.parse(
    typed([
      { partNumber: '', pieces: ' ' },
      { partNumber: ' P-1 ', pieces: '4' },
    ]),
  );
  expect(sentOf(read)).toEqual({
    name: 'Left float 31',
    neededOn: null,
    note: null,
    needs: [{ partNumber: 'P-1', pieces: 4 }],
  });
});

test.each([
  ['a name is missing', typed([], { name: ' ' }), ['name']],
  ['half a row', typed([{ partNumber: '', pieces: '4' }]), ['needs.0.partNumber']],
  ['no number', typed([{ partNumber: 'P-1', pieces: 'x' }]), ['needs.0.pieces']],
  ['none needed', typed([{ partNumber: 'P-1', pieces: '0' }]), ['needs.0.pieces']],
  [
    'a part twice',
    typed([
      { partNumber: 'P-1', pieces: '1' },
      { partNumber: 'P-1', pieces: '2' },
    ]),
    ['needs.1.partNumber'],
  ],
])('%s is told where it is', (_, form, paths) => expect(faultsOf(form)).toEqual(paths));

test('a refusal of a need that was sent belongs to the row it was typed in', () => {
  const read = AssemblyFields.parse(
    typed([
      { partNumber: '', pieces: '' },
      { partNumber: 'P-1', pieces: '4' },
    ]),
  );
  expect(atFormRow('needs.0.pieces', read)).toBe('needs.1.pieces');
  expect(atFormRow('needs', read)).toBe('needs');
  expect(atFormRow('name', read)).toBe('name');
});

test('an assembly that is changed begins with what it has, and one row more', () => {
  const fields = fieldsOf({
    name: 'Left float 31',
    neededOn: null,
    note: null,
    needs: [{ partNumber: 'P-1', pieces: 4 }],
  } as unknown as Parameters<typeof fieldsOf>[0]);
  expect(fields).toEqual(
    typed([
      { partNumber: 'P-1', pieces: '4' },
      { partNumber: '', pieces: '' },
    ]),
  );
});
