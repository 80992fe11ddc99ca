/** The steps of heat treating that a certificate gives a cycle for. */
export type Step =
  | 'solution'
  | 'natural_age'
  | 'artificial_age'
  | 'austenitize'
  | 'temper'
  | 'stress_relief'
  | 'anneal'
  | 'normalize'
  | 'embrittlement_relief';

/**
 * How each is said. Those that contain another's words come first: a stress relief bake is no embrittlement relief, a
 * natural age no age.
 */
const SAID: readonly (readonly [Step, string])[] = [
  [
    'embrittlement_relief',
    String.raw`(?:post[- ]plat(?:e|ing) )?(?:hydrogen |h\.? ?e\.? )?(?:de-?)?embritt(?:le)?(?:ment|ling|led|d)?(?: relief| relieved?| relieving)?(?: bak(?:e|ed|ing))?|h\.?e\.? (?:relief|bake)(?: bake)?|(?:post[- ]plat(?:e|ing) )?bak(?:e|ed|ing)(?: for (?:hydrogen )?embrittlement relief)?|(?:wasserstoff)?entspr[oö]d\w*|d[eé]gazage|deshidrogenad[oa]|deidrogenazione|deshydrog[eé]nation|d[eé]shydrog[eé]nation|hydrogen bake|hydrogen relief(?: bake)?`,
  ],
  [
    'stress_relief',
    String.raw`stress[- ]?reliev(?:e|ed|ing)(?: bak(?:e|ed|ing))?|stress[- ]?relief(?: bak(?:e|ed|ing))?|spannungsarm\w*|d[eé]tensionn\w*|relev[eé] de contraintes|alivio de tensiones`,
  ],
  [
    'natural_age',
    String.raw`nat(?:ural(?:ly)?|\.)?[- ]+ag(?:e|ed|e?ing)|ag(?:ed|ing) naturally|(?:room[- ]temp(?:erature|\.)?|r\.?t\.?)[- ]ag(?:e|ed|e?ing)|ag(?:e|ed|e?ing) at (?:room temp(?:erature|\.)?|r\.?t\.?|ambient)|natural|kaltausla[a-zäöü]*|kaltausl\w*|maturation|vieillissement naturel|envejecimiento natural`,
  ],
  [
    'artificial_age',
    String.raw`art(?:ificial(?:ly)?|\.)[- ]*ag(?:e|ed|e?ing)|precipitation(?: heat[- ]?treat(?:ed|ment|ing)?|[- ]harden(?:ed|ing)?| treatment| ag(?:e|ed|e?ing))?|age[- ]?harden(?:ed|ing)?|p\.?h\.?t\.?|ppt\.? ag(?:e|ed|e?ing)|precip\.?(?: h\.?t\.?| ag(?:e|ed|e?ing)| treat(?:ed|ment)?)?|ag(?:e|ed|e?ing)|warmausl\w*|vieillissement artificiel|vieillissement|envejecimiento`,
  ],
  [
    'solution',
    String.raw`sol(?:utio)?n\.?(?:[- ]?heat)?[- ]?treat(?:ed|ment|ing)?|solution[- ](?:heat|anneal(?:ed)?|annealing)|solutioni[sz](?:e|ed|ing)|solution|sol(?:utio)?n?\.?[- ]h\.?t\.?|sol\.[- ]?treat(?:ed|ment|ing)?|sol\. ?(?:h\.?t\.?|&|\+)|soln\.?|s\.?h\.?t\.?|l[oö]sungsgl[uü]h\w*|mise en solution|solubilizaci[oó]n`,
  ],
  ['normalize', String.raw`normali[sz](?:e|ed|ing)|normalgl[uü]h\w*|normalisation`],
  [
    'austenitize',
    String.raw`aust(?:eniti[sz](?:e|ed|ing)|eniti[sz]ation|enit\.|\.)?(?=[\s:.,]|$)|austenitizaci[oó]n|harden(?:ed|ing)?|h[aä]rten|aust[eé]nitisation|austenitizado|temple`,
  ],
  [
    'temper',
    String.raw`(?:double[- ]|first |second |1st |2nd )?temper(?:ed|ing)?|anlassen|angelassen|revenu|revenido`,
  ],
  ['anneal', String.raw`anneal(?:ed|ing)?|weichgl[uü]h\w*|recuit|recocido`],
];

const ANY = new RegExp(
  `(?<![\\p{L}\\p{N}])(?:${SAID.map(([step, said]) => `(?<${step}>${said})`).join('|')})(?![\\p{L}\\p{N}])`,
  'giu',
);

/** Everything that sounds like a step and is none of this certificate's: a property, a title, a material's own condition. */
const NO_STEP =
  /^[\s-]*(?:designation|resist|crack|furnace|class|cert|age of|number|spec|free|susceptib|required|not)/i;

export interface SaidStep {
  readonly step: Step;
  readonly start: number;
  readonly end: number;
}

/** Each step named in a text, in its order. */
export function stepsIn(text: string): SaidStep[] {
  return [...text.matchAll(ANY)].flatMap((match) => {
    const step = SAID.find(([name]) => match.groups?.[name] !== undefined)?.[0];
    const end = match.index + match[0].length;
    if (!step || NO_STEP.test(text.slice(end))) return [];
    return [{ step, start: match.index, end }];
  });
}
