import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';
import type { SMTPServerDataStream, SMTPServerSession } from 'smtp-server';
import type { Listening } from '../listen';
import type { MailStore } from './mail-store';

/**
 * How the mail server can be made to fail:
 * `refuse` turns every connection away (421), `defer` refuses the message for now (451), `reject` refuses the recipient
 * for good (550), `drop` keeps the message and cuts the line before saying so, which is the case in which a sender cannot
 * know and sends again.
 */
export const MAIL_FAILURES = ['none', 'refuse', 'defer', 'reject', 'drop'] as const;
export type MailFailure = (typeof MAIL_FAILURES)[number];

const SIZE_LIMIT_BYTES = 60 * 1024 * 1024;

interface SmtpOptions {
  store: MailStore;
  port: number;
  host: string;
  failure: () => MailFailure;
}

/** Real SMTP. Takes any sign-in or none and never offers TLS, because it only listens on this machine. */
export function startSmtp({ store, port, host, failure }: SmtpOptions): Promise<Listening> {
  const server: SMTPServer = new SMTPServer({
    banner: 'Lotwright stand-in',
    authOptional: true,
    allowInsecureAuth: true,
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    size: SIZE_LIMIT_BYTES,
    closeTimeout: 200,
    onAuth: (auth, _session, done) => done(null, { user: auth.username ?? 'anyone' }),
    onConnect: (_session, done) =>
      done(failure() === 'refuse' ? refusal(421, 'The mail server is not taking connections') : null),
    onRcptTo: (address, _session, done) =>
      done(failure() === 'reject' ? refusal(550, `No such mailbox: ${address.address}`) : null),
    onData: (stream, session, done) => {
      keepMessage(store, stream, session).then(
        () => {
          if (failure() === 'drop') return cutConnection(server, session);
          done(failure() === 'defer' ? refusal(451, 'Try again later') : null);
        },
        (error: unknown) =>
          done(
            error instanceof RangeError
              ? refusal(552, error.message)
              : refusal(451, 'The message could not be kept'),
          ),
      );
    },
  });

  async function keepMessage(
    into: MailStore,
    stream: SMTPServerDataStream,
    session: SMTPServerSession,
  ): Promise<void> {
    const chunks: Buffer[] = [];
    for await (const chunk of stream as AsyncIterable<Buffer>) chunks.push(chunk);
    if (stream.sizeExceeded) throw new RangeError('The message is larger than 60 MB');
    if (failure() === 'defer') return;
    const { mailFrom, rcptTo } = session.envelope;
    const envelope = {
      from: mailFrom === false ? '' : mailFrom.address,
      recipients: rcptTo.map(({ address }) => address.toLowerCase()),
    };
    await into.add(Buffer.concat(chunks), envelope, new Date());
  }

  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      server.off('error', reject);
      // A client that goes away in mid-sentence is no reason for the stand-in to end.
      server.on('error', () => undefined);
      const { port: given } = server.server.address() as AddressInfo;
      resolve({ port: given, close: () => new Promise((done) => server.close(() => done())) });
    });
  });
}

function refusal(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode });
}

function cutConnection(server: SMTPServer, session: SMTPServerSession): void {
  for (const connection of server.connections as Set<{
    session: SMTPServerSession;
    _socket: { destroy(): void };
  }>) {
    if (connection.session.id === session.id) connection._socket.destroy();
  }
}
