/** Words that stand together otherwise than the field's name has them. */
const SAID: Record<string, string> = {
  qty_accepted: 'pieces accepted',
  qty_rejected: 'pieces rejected',
  part_number: 'part number',
  rev: 'revision',
  quench_delay_s: 'quench delay',
  set_temp: 'set temperature',
  class_type: 'class, type',
  ndt: 'inspection',
  signature_present: 'signature',
  conformance_statement: 'statement of conformance',
};

const PARTS: Record<string, string> = { lines: 'row', cycles: 'cycle', readings: 'reading' };

/** `lines[0].qty_accepted` as a person says it: `Row 1, pieces accepted`. */
export function fieldWords(field: string): string {
  const words = field
    .split('.')
    .map((step) => {
      const [, name = step, at] = /^(\w+?)(?:\[(\d+)\])?$/.exec(step) ?? [];
      const said = SAID[name] ?? PARTS[name] ?? name.replaceAll('_', ' ');
      return at === undefined ? said : `${said} ${Number(at) + 1}`;
    })
    .join(', ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}
