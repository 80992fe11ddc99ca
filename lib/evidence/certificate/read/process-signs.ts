import type { Process } from '../../../trade/process';

/** Numbers that order a process, written as `recogniseSpecification` writes them. The first that fits decides. */
export const ORDERED_BY: readonly (readonly [RegExp, Process])[] = [
  [/^AMS2759\/11\b/, 'stress_relief'],
  [/^AMS2759\/9\b/, 'embrittlement_relief'],
  [/^(?:AMS2759|AMS-H-6875|MIL-H-6875|AMS-H-6200|AMS2757)/, 'harden_and_temper'],
  [/^(?:AMS2770|AMS2771|AMS2772|AMS-H-6088|MIL-H-6088|BAC5602)/, 'solution_heat_treat_and_age'],
  [/^(?:AMS-QQ-P-416|QQ-P-416|AMS2400|AMS2401|MIL-STD-870|ASTM B766|ISO 2082|MIL-STD-1500)/, 'cadmium_plate'],
  [/^(?:ASTM B633|AMS2402|AMS2417|QQ-Z-325|ASTM F1941|ISO 2081|ISO 19598|AMS2461)/, 'zinc_plate'],
  [
    /^(?:MIL-A-8625|MIL-PRF-8625|AMS-A-8625|AMS246[89]|AMS247[012]|AMS2482|ISO 7599|ISO 10074|ASTM B580)/,
    'anodize',
  ],
  [
    /^(?:MIL-DTL-5541|MIL-C-5541|AMS-C-5541|AMS247[347]|MIL-DTL-81706|MIL-C-81706|ASTM B449|ISO 10546)/,
    'chemical_film',
  ],
  [/^(?:AMS2700|AMS-QQ-P-35|QQ-P-35|ASTM A967|ASTM A380|ISO 16048|AMS-STD-753)/, 'passivation'],
  [
    /^(?:ASTM E1417|ASTM E165|MIL-STD-6866|AMS2647|AMS2645|ISO 3452|EN 571|ASTM E1209|ASTM E1208|MIL-I-6866)/,
    'fluorescent_penetrant',
  ],
  [
    /^(?:ASTM E1444|ASTM E709|ASTM E3024|MIL-STD-1949|AMS2640|AMS2641|ISO 9934|MIL-I-6868)/,
    'magnetic_particle',
  ],
  [
    /^(?:AMS-QQ-N-290|QQ-N-290|AMS2403|AMS2404|AMS2405|AMS-C-26074|MIL-C-26074|ASTM B733|ASTM B689|AMS2423|AMS2424)/,
    'nickel_plate',
  ],
  [/^(?:AMS-QQ-C-320|QQ-C-320|AMS2406|AMS2460|ASTM B650|MIL-STD-1501)/, 'chromium_plate'],
  [/^(?:DOD-P-16232|MIL-DTL-16232|MIL-P-16232|TT-C-490|AMS2480|AMS2481)/, 'phosphate'],
  [/^(?:AMS2430|AMS2432|AMS-S-13165|MIL-S-13165|AMS2431)/, 'shot_peen'],
  [/^(?:ASTM E1742|ASTM E1030|AMS2635|MIL-STD-453)/, 'radiography'],
  [/^(?:AMS-STD-2154|MIL-STD-2154|ASTM E2375|AMS2154|AMS2630|AMS2631)/, 'ultrasonic'],
];

/** Numbers that order no process: of materials, tests, instruments, people and systems of quality. */
export const ORDERS_NOTHING =
  /^(?:AMS2750|AMS2658|AMS2644|AMS3\d{3}|AMS[4-7]\d{3}|AMS-QQ-A-|QQ-A-|QQ-S-|WW-T-|AMS-WW|AMS-T-|AMS-S-6|MIL-[ST]-|NAS |EN 4179|EN 9\d{3}|EN 10\d{3}|EN ISO 9|ISO 9\d{3}\b|ISO 17025|ISO 10012|ISO 6508|ISO 6507|ISO 13485|ISO 14001|ASTM E(?:18|10|92|140|384|8|376|1004|3)\b|ASTM B(?:209|211|221|244|487|499|504|567|568|117|85)\b|ASTM A(?:108|276|370|484|564|582)\b|ANSI|MIL-STD-(?:105|1916|45662|414)|MIL-STD-(?:120|410)|BS (?:L|S|T|TA|HR))/;

/** How a process is said; the weight of the words where they could mean something else too. */
export const SAID_AS: readonly (readonly [RegExp, Process, number])[] = [
  [
    /fluorescent[- ]penetrant|\bFPI\b|liquid penetrant|dye[- ]?penetrant|penetrant (?:inspection|testing|examination)|eindringpr[uü]f\w*|ressuage|l[ií]quidos penetrantes/i,
    'fluorescent_penetrant',
    1,
  ],
  [
    /magnetic[- ]particle|\bMPI\b|\bMT inspection\b|magnetpulver\w*|magn[eé]toscopie|part[ií]culas magn[eé]ticas/i,
    'magnetic_particle',
    1,
  ],
  [/cad(?:mium)?[- ]?plat\w*|\bcadmium\b|verkadm\w*|kadmi\w*|cadmiage|cadmiado/i, 'cadmium_plate', 1],
  [
    /zinc[- ]?plat\w*|electro-?zinc|zinc electroplat\w*|\bzinc\b(?!\s*(?:phosphate|primer|chromate primer))|verzink\w*|galvanisch verzinkt|zingage|cincado/i,
    'zinc_plate',
    1,
  ],
  [/anodi[sz]\w*|anodic coat\w*|eloxal|eloxier\w*|anodizado/i, 'anodize', 1],
  [
    /chem(?:ical|\.)?[- ]?(?:film|conversion)|chromate conversion|conversion coat\w*|chem film|chromatier\w*|conversion chimique|chromatation/i,
    'chemical_film',
    0.8,
  ],
  [/passivat\w*|passivier\w*|pasivad\w*/i, 'passivation', 0.9],
  [/stress[- ]?relie\w*|spannungsarm\w*|d[eé]tensionn\w*|alivio de tensiones/i, 'stress_relief', 0.7],
  [
    /harden(?:ed|ing)? (?:and|&|\+) temper\w*|quench(?:ed|ing)? (?:and|&|\+) temper\w*|austeniti[sz]\w*|verg[uü]t\w*|tremp[eé] et revenu|trempe et revenu|temple y revenido/i,
    'harden_and_temper',
    1,
  ],
  [
    /solution[- ](?:heat[- ]?)?treat\w*|solution,? quench|l[oö]sungsgl[uü]h\w*|mise en solution|solubiliza\w*|(?:natural|artificial)(?:ly)? ag(?:e|ed|ing)|precipitation/i,
    'solution_heat_treat_and_age',
    1,
  ],
  [/nickel[- ]?plat\w*|electroless nickel|vernickel\w*|nickelage/i, 'nickel_plate', 1],
  [/chrom(?:e|ium)[- ]?plat\w*|verchrom\w*|chromage/i, 'chromium_plate', 1],
  [/phosphat\w*/i, 'phosphate', 0.8],
  [/shot[- ]?peen\w*|kugelstrahl\w*|grenaillage/i, 'shot_peen', 1],
  [/radiograph\w*|\bx-?ray inspect\w*/i, 'radiography', 1],
  [/ultrasonic (?:inspect|test)\w*|ultraschall\w*/i, 'ultrasonic', 1],
];
