interface Named {
  readonly subject: string;
  readonly aspect: '' | 'temperature' | 'time';
}

/** First match names it: a quench delay is no quench medium, the start of a bake is no bake. */
const SUBJECTS: readonly (readonly [RegExp, string])[] = [
  [/quench\w*\s*(?:delay|transfer|time)|transfer time/, 'quench delay'],
  [/quench(?:ant)?\b.*temp/, 'quench temperature'],
  [/quench/, 'quench'],
  [/stress relie/, 'stress relief'],
  [/bak(?:e|ed|ing)\b.*(?:start|delay|within)|start\w*.*\bbak/, 'bake start'],
  [/\bbak(?:e|ed|ing)\b|embrittlement relief/, 'bake'],
  [/\bsoak/, 'soak'],
  [/solution/, 'solution'],
  [/second.*\bag(?:e|ed|ing|eing)\b/, 'second age'],
  [/\bag(?:e|ed|ing|eing)\b/, 'age'],
  [/anneal/, 'anneal'],
  [/austeniti/, 'austenitize'],
  [/temper(?:ing|ed)?\b/, 'temper'],
  [/hardness|\bhr[a-z]\b/, 'hardness'],
  [/conductiv|iacs/, 'conductivity'],
  [/tensile|strength/, 'strength'],
  [/coating weight|\bweight/, 'weight'],
  [/thickness/, 'thickness'],
  [/salt spray|corrosion/, 'salt spray'],
  [/sampl/, 'sample'],
  [/sensitiv/, 'sensitivity'],
  [/type/, 'type'],
  [/method/, 'method'],
  [/medium/, 'medium'],
];

function named(characteristic: string): Named {
  const text = characteristic.trim().toLowerCase();
  const subject = SUBJECTS.find(([says]) => says.test(text))?.[1] ?? text;
  if (/temperature/.test(text)) return { subject, aspect: 'temperature' };
  return { subject, aspect: /\btime\b|\bhours?\b/.test(text) ? 'time' : '' };
}

/**
 * Whether two lines ask for the same thing in other words: `Thickness` and `Coating thickness`, `Age` and
 * `Ageing time`; but not `Bake temperature` and `Bake time`.
 */
export function isSameCharacteristic(one: string, other: string): boolean {
  const [a, b] = [named(one), named(other)];
  return a.subject === b.subject && (a.aspect === b.aspect || a.aspect === '' || b.aspect === '');
}

/** What of the proposals is not asked for already: what a person typed stands, however it is worded. */
export const notAskedYet = <Proposed extends { characteristic: string }>(
  proposed: readonly Proposed[],
  asked: readonly { characteristic: string }[],
): Proposed[] =>
  proposed.filter((one) => !asked.some((it) => isSameCharacteristic(it.characteristic, one.characteristic)));
