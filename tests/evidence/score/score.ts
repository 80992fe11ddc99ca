import { parseArgs } from 'node:util';
import { compare } from '@/lib/evidence/certificate/compare/compare';
import { statedIn } from '@/lib/evidence/certificate/read/read-certificate';
import { openFile } from '@/lib/evidence/open/open-file';
import { makeRecogniser } from '@/lib/evidence/open/recogniser';
import { HELD_OUT_LAYOUTS } from '../generate/held-out-layouts';
import { SECOND_HELD_OUT_LAYOUTS } from '../generate/held-out-layouts-2';
import { THIRD_HELD_OUT_LAYOUTS } from '../generate/held-out-layouts-3';
import { FOURTH_HELD_OUT_LAYOUTS } from '../generate/held-out-layouts-4';
import { FIFTH_HELD_OUT_LAYOUTS } from '../generate/held-out-layouts-5';
import { LAYOUTS } from '../generate/layouts';
import { KINDS, makeCertificate, type Kind, type MadeCertificate } from '../generate/make-certificate';
import { judge } from './compare-with-truth';
import { Tally } from './tally';

/**
 * Reads generated certificates and prints how well.
 *
 * `--kind text,scan,scan150,photo` which kinds of file; `--count 72` how many of each; `--from 0` the first seed;
 * `--layouts usual|first|second|third|fourth|fifth` the layouts the rules were made with, or those written after them;
 * `--verbose` names every field that was not read as it was written.
 */
const { values: options } = parseArgs({
  options: {
    kind: { type: 'string', default: KINDS.join(',') },
    count: { type: 'string', default: '72' },
    from: { type: 'string', default: '0' },
    layouts: { type: 'string', default: 'usual' },
    verbose: { type: 'boolean', default: false },
  },
});

const SETS = {
  usual: LAYOUTS,
  first: HELD_OUT_LAYOUTS,
  second: SECOND_HELD_OUT_LAYOUTS,
  third: THIRD_HELD_OUT_LAYOUTS,
  fourth: FOURTH_HELD_OUT_LAYOUTS,
  fifth: FIFTH_HELD_OUT_LAYOUTS,
} as const;
const layouts = Object.entries(SETS).find(([name]) => name === options.layouts)?.[1] ?? LAYOUTS;
const kinds = KINDS.filter((kind) => options.kind.split(',').includes(kind));
const recogniser = makeRecogniser();
const whole = new Tally();
for (const kind of kinds) {
  const tally = new Tally();
  for (let seed = Number(options.from); seed < Number(options.from) + Number(options.count); seed += 1) {
    const made = await makeCertificate(seed, layouts, kind);
    // A mail's text has no other kind of file: it counts once.
    if (made.kind !== kind) continue;
    await readOne(made, kind, tally);
  }
  tally.print(kind);
  whole.add(tally);
}
whole.printCalibration();
await recogniser.close();

async function readOne(made: MadeCertificate, kind: Kind, tally: Tally): Promise<void> {
  const say = (words: string): void => {
    if (options.verbose) console.log(`  ${made.seed} ${made.layout} ${kind}: ${words}`);
  };
  const started = performance.now();
  const opened = await openFile(made.bytes, { name: made.name, recogniser });
  const stated = statedIn(opened);
  tally.seconds(performance.now() - started, made.pages);
  if (stated.length !== made.truths.length)
    say(`${stated.length} certificates instead of ${made.truths.length}`);
  made.truths.forEach((truth, index) => {
    const read = stated[index];
    if (!read) {
      tally.lost();
      return;
    }
    for (const field of judge(truth, read)) {
      const fact = read.facts.find((one) => one.field === field.path);
      tally.field(field, fact?.confidence ?? null);
      if (!/right/.test(field.outcome))
        say(
          `${field.path} is "${field.truth ?? 'null'}", read "${field.read ?? 'null'}" (${fact?.confidence ?? '-'})`,
        );
    }
  });
  const [first, ...others] = stated;
  if (!first) return;
  const { discrepancies } = compare({
    stated: first,
    file: opened,
    order: made.story.order,
    others,
    today: made.story.today,
  });
  const codes = discrepancies.map(({ code }) => code);
  const missed = made.planted.filter((code) => !codes.includes(code));
  const alarms = discrepancies.filter(({ code }) => !made.planted.includes(code));
  tally.discrepancies(made.planted.length, missed.length, alarms.length);
  for (const code of missed) say(`missed ${code} among ${codes.join(', ') || 'none'}`);
  for (const { code, message } of alarms) say(`false alarm ${code}: ${message}`);
}
