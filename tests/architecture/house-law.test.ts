/// <reference types="vite/client" />
import { expect, test } from 'vitest';

import type { Endpoint } from '@/lib/api/endpoint';

import { filesBelow, functionsOf, importsOf, textOf } from './sources';

const endpointFiles = filesBelow('lib', /endpoints\.ts$/).filter(
  (file) => !file.endsWith('all-endpoints.ts'),
);

interface Bound {
  endpoint: string;
  declaration: string;
  verb: string;
  verbFile: string;
}

/** What each endpoint runs, followed through the imports of the file that binds it. */
function boundIn(file: string): Bound[] {
  const imports = importsOf(file);
  const bindings = [
    ...textOf(file).matchAll(
      /export const (\w+)Endpoint = endpoint(?:InSteps)?\(\s*([\w.]+),\s*([\s\S]*?)\);\n/g,
    ),
  ];
  return bindings.map((match) => {
    const [, endpoint = '', declaration = '', bound = ''] = match;
    const named =
      /run:\s*([\w.]+)/.exec(bound)?.[1] ??
      /=>\s*([\w.]+)\(/.exec(bound)?.[1] ??
      /^\{?[\s\S]*?\brun\b/.exec(bound.trim() === 'run' ? bound : '')?.[0] ??
      bound.trim().replace(/,$/, '');
    const [head = '', member] = named.split('.');
    const source = imports.get(head);
    return { endpoint, declaration, verb: member ?? source?.name ?? head, verbFile: source?.from ?? file };
  });
}

const bound = endpointFiles.flatMap(boundIn);

const byName = new Map(
  Object.values(import.meta.glob<Record<string, Endpoint>>('/lib/**/*endpoints.ts', { eager: true })).flatMap(
    (module) => Object.entries(module),
  ),
);

const isWrite = (endpoint: string): boolean =>
  byName.get(`${endpoint}Endpoint`)?.declaration.method !== 'get';

/** Whether a function reaches one of the calls, directly or through functions of the product, some steps deep. */
function reaches(
  file: string,
  name: string,
  wanted: readonly string[],
  at = { depth: 5, seen: new Set<string>() },
): boolean {
  const mark = `${file}#${name}`;
  if (at.depth < 0 || at.seen.has(mark)) return false;
  at.seen.add(mark);
  const functions = functionsOf(file);
  const own = functions.find((one) => one.name === name);
  if (!own) return false;
  if (own.calls.some((call) => wanted.includes(call))) return true;
  const imports = importsOf(file);
  return own.calls.some((call) => {
    if (functions.some((one) => one.name === call)) return reaches(file, call, wanted, at);
    const from = imports.get(call);
    return (
      from !== undefined &&
      from.from.startsWith('lib/') &&
      reaches(from.from, from.name, wanted, { ...at, depth: at.depth - 1 })
    );
  });
}

test('every endpoint was found, with the function it runs', () => {
  expect(bound.length).toBeGreaterThan(60);
  const lost = bound
    .filter(({ verb, verbFile }) => !functionsOf(verbFile).some((one) => one.name === verb))
    .map(({ endpoint, verb, verbFile }) => `${endpoint}: ${verb} in ${verbFile}`);
  expect(lost).toEqual([]);
});

test('every verb and every query asks first whether this person may', () => {
  const careless = bound.filter(({ verb, verbFile }) => {
    const own = functionsOf(verbFile).find((one) => one.name === verb);
    return own !== undefined && !/^(await )?authorize\(ctx, '[\w.]+'\)/.test(own.first);
  });
  expect(careless.map(({ endpoint, verbFile }) => `${endpoint} in ${verbFile}`)).toEqual([]);
});

/** Writes that change nothing of a shop's: what they are is said here, so that no other slips in. */
const RECORDED_ELSEWHERE: Record<string, string> = {
  receivePaymentEvent: 'the event is kept as it came; the job that works it off records what it changes',
  checkLotImport: 'reads only: it is a POST because it carries a whole file',
  checkOwnTable: 'reads only: it is a POST because it carries a whole file',
  linkPayoutAccount:
    'the processor’s own account with the payment service; a processor has no chain of its own',
  inviteColleague: 'between people of a processor, which has no chain of its own; told in the log',
  setColleagueActive: 'between people of a processor, which has no chain of its own; told in the log',
};

test('every write tells the audit trail', () => {
  const silent = bound.filter(
    ({ endpoint, verb, verbFile }) =>
      !(endpoint in RECORDED_ELSEWHERE) && isWrite(endpoint) && !reaches(verbFile, verb, ['recordAudit']),
  );
  expect(silent.map(({ endpoint, verbFile }) => `${endpoint} in ${verbFile}`)).toEqual([]);
});

test('only the kit, the worker and the tests make a context', () => {
  const makers = [
    ...filesBelow('app'),
    ...filesBelow('components'),
    ...filesBelow('lib'),
    ...filesBelow('db'),
  ].filter((file) => /requestId: newId\(\)|requestId: jobId/.test(textOf(file)));
  expect(
    makers.filter((file) => !/^(app\/_kit\/|lib\/jobs\/worker\.ts|db\/seed\/|lib\/stack\/)/.test(file)),
  ).toEqual([]);
});

test('nothing below the kit asks a clock', () => {
  const domains = filesBelow('lib', /\.ts$/).filter(
    (file) =>
      !/^lib\/(stack|jobs\/worker|jobs\/job|readiness|log|api\/client|people\/throttle|mail|storage|payments|pdf|portal\/.*-client|readings\/cli\/)/.test(
        file,
      ),
  );
  const asking = domains.filter((file) => /new Date\(\)|Date\.now\(\)/.test(textOf(file)));
  expect(asking).toEqual([]);
});

test('settings are read in one place', () => {
  const files = ['app', 'components', 'emails', 'lib', 'db'].flatMap((folder) => filesBelow(folder));
  const reading = files.filter((file) => /process\.env/.test(textOf(file)));
  expect(
    reading.filter((file) => !/^(lib\/env\.ts|lib\/stack\/|db\/(cluster|postgres-binaries)\.ts)/.test(file)),
  ).toEqual([]);
});

test('a client component is a leaf, never a page or a layout', () => {
  const clients = filesBelow('app').filter((file) => /^['"]use client['"]/.test(textOf(file).trimStart()));
  expect(clients.filter((file) => /\/(page|layout|loading)\.tsx$/.test(file))).toEqual([]);
});

test('no shelf is called utils, helpers or types, and no file only passes others on', () => {
  const files = ['app', 'components', 'emails', 'lib', 'db'].flatMap((folder) => filesBelow(folder));
  expect(files.filter((file) => /\/(utils|helpers|types|misc|common)(\.tsx?|\/)/.test(file))).toEqual([]);
  expect(files.filter((file) => /^export \* from/m.test(textOf(file)))).toEqual([]);
});
