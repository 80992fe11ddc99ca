import { subscribe } from 'node:diagnostics_channel';
import type { IncomingMessage } from 'node:http';

/**
 * Adds to every request's `x-forwarded-for` whom the socket speaks to, as a proxy would. Next fills it in only where the
 * header is missing, so that a client could write its own address there.
 */
export function notePeers(): void {
  subscribe('http.server.request.start', (message) => {
    const { headers, socket } = (message as { request: IncomingMessage }).request;
    const said = headers['x-forwarded-for'];
    headers['x-forwarded-for'] = [said, socket.remoteAddress].flat().filter(Boolean).join(', ');
  });
}
