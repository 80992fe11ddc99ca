import { createServer } from 'node:http';
import type { RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';

export interface Listening {
  port: number;
  close(): Promise<void>;
}

/**
 * Starts an HTTP server and says which port it got, so that tests can ask for port 0.
 *
 * Closing cuts open connections: browsers keep theirs alive, and a stand-in that waits for them would hold up Ctrl-C.
 */
export function listen(
  handler: RequestListener,
  { port, host }: { port: number; host: string },
): Promise<Listening> {
  const server = createServer(handler);
  // A certificate of 50 MB over a slow line takes longer than Node's five minutes would allow.
  server.requestTimeout = 0;

  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      server.off('error', reject);
      const { port: given } = server.address() as AddressInfo;
      const close = () =>
        new Promise<void>((done, failed) => {
          server.close((error) => (error ? failed(error) : done()));
          server.closeAllConnections();
        });
      resolve({ port: given, close });
    });
  });
}
