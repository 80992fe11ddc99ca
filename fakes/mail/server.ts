import path from 'node:path';
import { answerJson } from '../answer';
import { listen } from '../listen';
import { isProgram, portFromEnv, runProgram } from '../run-program';
import { serveInbox } from './inbox';
import { MailStore } from './mail-store';
import { startSmtp } from './smtp';
import type { MailFailure } from './smtp';

export interface MailServerOptions {
  smtpPort: number;
  httpPort: number;
  dir: string;
  host?: string;
}

export interface MailServer {
  /** Of the inbox page. */
  address: string;
  smtpPort: number;
  httpPort: number;
  close(): Promise<void>;
}

/** A mail server that delivers to a folder, with an inbox page to read it. */
export async function startMailServer({
  smtpPort,
  httpPort,
  dir,
  host = '127.0.0.1',
}: MailServerOptions): Promise<MailServer> {
  const store = await MailStore.open(dir);
  let failure: MailFailure = 'none';

  const smtp = await startSmtp({ store, port: smtpPort, host, failure: () => failure });
  const inbox = { store, failure: () => failure, setFailure: (next: MailFailure) => void (failure = next) };
  const http = await listen(
    (request, response) => {
      serveInbox(inbox, request, response).catch((error: unknown) => {
        if (response.headersSent) return response.destroy();
        answerJson(response, 500, { error: error instanceof Error ? error.message : String(error) });
      });
    },
    { port: httpPort, host },
  ).catch(async (error: unknown) => {
    await smtp.close();
    throw error;
  });

  return {
    address: `http://${host}:${http.port}`,
    smtpPort: smtp.port,
    httpPort: http.port,
    close: async () => {
      await Promise.all([smtp.close(), http.close()]);
    },
  };
}

if (isProgram(import.meta.url)) {
  await runProgram('Mail', () =>
    startMailServer({
      smtpPort: portFromEnv('FAKE_SMTP_PORT', 4625),
      httpPort: portFromEnv('FAKE_MAIL_HTTP_PORT', 4680),
      dir: process.env['FAKE_MAIL_DIR'] ?? path.join('.data', 'mail'),
      host: process.env['FAKE_HOST'] ?? '127.0.0.1',
    }),
  );
}
