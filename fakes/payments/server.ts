import path from 'node:path';
import { answerJson } from '../answer';
import { listen } from '../listen';
import { isProgram, portFromEnv, runProgram } from '../run-program';

export interface PaymentsServerOptions {
  port: number;
  file: string;
  host?: string;
}

export async function startPaymentsServer({ port, host = '127.0.0.1' }: PaymentsServerOptions) {
  const http = await listen((request, response) => answerJson(response, request.url === '/health' ? 200 : 404, { ok: true }), { port, host });
  return { address: `http://${host}:${http.port}`, port: http.port, close: http.close };
}

if (isProgram(import.meta.url)) {
  await runProgram('Payments', () =>
    startPaymentsServer({ port: portFromEnv('FAKE_PAYMENTS_PORT', 4612), file: path.join('.data', 'payments.json') }),
  );
}
