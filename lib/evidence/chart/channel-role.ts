import type { ChannelRole } from './judged-chart';

/** Words of headings, the first that fits decides. */
const ROLES: readonly (readonly [role: ChannelRole, words: RegExp])[] = [
  [
    'other',
    /%|output|\bout\b|\bop\b|\bpower\b|leistung|puissance|pressure|druck|pression|vacuum|vakuum|\bm?bar\b|torr|\bpsi\b|\bk?pa\b|flow|humid|feuchte|alarm|status|door|tür|porte|\bm?v\b|volt|\bm?a\b|amps?|\bkw\b|carbon|dew ?point|taupunkt|\bo2\b|oxygen|battery|ambient|room|umgebung|\bcj\w?\b|cold ?junction|deviation|\bdev\b|abweichung|event|segment|\bseg\b|step|cycle|program|quench|wasser|water|\btank\b|coolant|kühl|abschreck|\bfan\b|speed|\brpm\b|count|over ?temp|high ?limit|hi ?limit|\bot\b/i,
  ],
  [
    'set_point',
    /set[\s_-]*(?:p(?:oin)?t|temp\w*|val\w*)?\b(?!.*(?:tc|load)\s*\d)|\bw?sp\d*\b|\bspt\b|_sp\b|soll\w*|\bconsigne\b|consigna|target|setp|program(?:med)? temp|\bsv\b|ref(?:erence)?\b/i,
  ],
  [
    'load',
    /\bload\b|\bpart\b|\bwork\b|work ?piece|\bpiece\b|charge\w*|\blast\b|bauteil|werkst|teil\b|pi[eè]ce|pieza|pezzo|carg\w*|carico|\bjob\b|embedded|probe/i,
  ],
  [
    'control',
    /control\w*|\bctrl\b|\bctl\b|regel\w*|regler|régul\w*|regul\w*|\bpv\d*\b|_pv\b|\bact(?:ual)?\b|\bist(?:wert)?\b|mesure|furnace|ofen|four\b|horno|forno|oven|\bair\b|luft|\bzone?\b|zone\d|chamber|kammer|atmos|\bbath\b|monitor|record(?:ing|er)?\b|retort|\bhot ?test\b|\bcold ?test\b/i,
  ],
];

/**
 * What a channel measures, by its heading. What nothing is said of — `TC1`, `TE 3`, `Channel 4` — is taken for a load
 * thermocouple, since to count a thermocouple too many can only shorten a soak.
 */
export function channelRole(words: string): ChannelRole {
  const plain = words.replace(/_/g, ' ');
  // A load thermocouple of the furnace's recorder is a load thermocouple.
  if (
    /\b(?:load|part|charge\w*|work)\b[\s.#-]*(?:t\/?c|te|couple|thermo\w*)?/i.test(plain) &&
    !/set|soll|\bsp\b|%/i.test(plain)
  ) {
    return 'load';
  }
  return ROLES.find(([, named]) => named.test(plain) || named.test(words))?.[0] ?? 'load';
}
