import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import type { IncomingMessage, ServerResponse } from 'node:http';
import S3rver from '@20minutes/s3rver';
import { DUMMY_ACCOUNT } from '@20minutes/s3rver/lib/models/account.js';
import S3Error from '@20minutes/s3rver/lib/models/error.js';
import { answerJson, answerWith } from '../answer';
import { chosenMode } from '../control';
import { listen } from '../listen';
import { readBody } from '../read-body';
import { isProgram, portFromEnv, runProgram } from '../run-program';
import { expected, keepWholeObjectsOnly } from './whole-objects';

/**
 * How the store can be made to fail:
 * `refuse` answers 503 SlowDown, as the real service does under load; `drop` cuts the connection;
 * `cut` takes the first bytes of an upload and then cuts the connection.
 */
const FAILURES = ['none', 'refuse', 'drop', 'cut'] as const;
type Failure = (typeof FAILURES)[number];

export interface StorageServerOptions {
  port: number;
  dir: string;
  host?: string;
  bucket?: string;
  /** Origins whose pages may upload and read straight from the browser. */
  origins?: readonly string[];
  accessKeyId?: string;
  secretAccessKey?: string;
}

export interface StorageServer {
  address: string;
  port: number;
  close(): Promise<void>;
}

/** Object storage over the real protocol, signatures checked, kept in a folder. */
export async function startStorageServer(options: StorageServerOptions): Promise<StorageServer> {
  const { port, dir, host = '127.0.0.1', bucket = 'lotwright', origins = [] } = options;
  const { accessKeyId = 'S3RVER', secretAccessKey = 'S3RVER' } = options;
  await mkdir(dir, { recursive: true });

  DUMMY_ACCOUNT.createKeyPair(accessKeyId, secretAccessKey);
  const s3 = new S3rver({
    directory: dir,
    silent: true,
    vhostBuckets: false,
    configureBuckets: [{ name: bucket, configs: origins.length > 0 ? [corsConfiguration(origins)] : [] }],
  });
  keepWholeObjectsOnly(s3);
  // An upload cut half way is an ordinary event here; without a listener Koa would print each one as a crash.
  s3.on('error', () => undefined);
  await s3.configureBuckets();

  const serveS3 = s3.callback();
  let failure: Failure = 'none';

  const listening = await listen(
    (request, response) => {
      const { pathname, searchParams } = new URL(request.url ?? '/', 'http://storage.local');
      if (pathname === '/health') return answerJson(response, 200, { ok: true, failure });
      if (pathname === '/control' && request.method === 'POST') {
        return void setFailure(request, response, (mode) => (failure = mode));
      }
      if (failure === 'drop') return void request.socket.destroy();
      if (failure === 'cut' && request.method === 'PUT')
        return void request.once('data', () => request.socket.destroy());
      if (failure === 'refuse')
        return answerError(response, new S3Error('SlowDown', 'Reduce your request rate.'));
      if (isAnonymous(request, searchParams))
        return answerError(response, new S3Error('AccessDenied', 'Access Denied'));

      const sha256 =
        headerOf(request, 'x-amz-checksum-sha256') ?? searchParams.get('x-amz-checksum-sha256') ?? undefined;
      expected.run({ sha256 }, () => serveS3(request, response));
    },
    { port, host },
  );

  return { address: `http://${host}:${listening.port}`, port: listening.port, close: listening.close };
}

/** The package lets unsigned requests in. A bucket of evidence is never public, so here they are refused as the real one would. */
function isAnonymous(request: IncomingMessage, search: URLSearchParams): boolean {
  if (request.method === 'OPTIONS') return false;
  return request.headers.authorization === undefined && !search.has('X-Amz-Signature');
}

function headerOf(request: IncomingMessage, name: string): string | undefined {
  const value = request.headers[name];
  return Array.isArray(value) ? value[0] : value;
}

function answerError(response: ServerResponse, error: S3Error): void {
  answerWith(response, { status: error.status, type: 'application/xml', body: error.toXML() });
}

async function setFailure(
  request: IncomingMessage,
  response: ServerResponse,
  set: (mode: Failure) => void,
): Promise<void> {
  try {
    const failure = chosenMode(await readBody(request), 'fail', FAILURES);
    set(failure);
    answerJson(response, 200, { failure });
  } catch (error) {
    answerJson(response, 400, { error: error instanceof Error ? error.message : String(error) });
  }
}

function corsConfiguration(origins: readonly string[]): string {
  const allowed = origins.map((origin) => `<AllowedOrigin>${origin}</AllowedOrigin>`).join('');
  return `<CORSConfiguration><CORSRule>${allowed}<AllowedMethod>PUT</AllowedMethod><AllowedMethod>GET</AllowedMethod><AllowedMethod>HEAD</AllowedMethod><AllowedHeader>*</AllowedHeader><ExposeHeader>ETag</ExposeHeader><MaxAgeSeconds>3000</MaxAgeSeconds></CORSRule></CORSConfiguration>`;
}

/** The web server's own addresses for start and tests, and the one it was told to have. */
function originsFromEnv(): string[] {
  const told = process.env['APP_URL'];
  return [
    ...new Set(['http://localhost:4600', 'http://localhost:5600', ...(told ? [new URL(told).origin] : [])]),
  ];
}

if (isProgram(import.meta.url)) {
  await runProgram('Object storage', () =>
    startStorageServer({
      port: portFromEnv('FAKE_STORAGE_PORT', 4690),
      dir: process.env['FAKE_STORAGE_DIR'] ?? path.join('.data', 'storage'),
      host: process.env['FAKE_HOST'] || '127.0.0.1',
      bucket: process.env['S3_BUCKET'] || 'lotwright',
      accessKeyId: process.env['S3_ACCESS_KEY_ID'] ?? 'S3RVER',
      secretAccessKey: process.env['S3_SECRET_ACCESS_KEY'] ?? 'S3RVER',
      origins: originsFromEnv(),
    }),
  );
}
