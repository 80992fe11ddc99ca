import type { ServerResponse } from 'node:http';

export interface Answer {
  status: number;
  type: string;
  body: string | Buffer;
  headers?: Record<string, string>;
}

export function answerWith(response: ServerResponse, { status, type, body, headers = {} }: Answer): void {
  response.writeHead(status, {
    'content-type': type,
    'content-length': Buffer.byteLength(body),
    'cache-control': 'no-store',
    'x-content-type-options': 'nosniff',
    ...headers,
  });
  response.end(body);
}

export function answerJson(response: ServerResponse, status: number, value: unknown): void {
  answerWith(response, {
    status,
    type: 'application/json; charset=utf-8',
    body: JSON.stringify(value, null, 2),
  });
}

export function answerHtml(
  response: ServerResponse,
  html: string,
  headers: Record<string, string> = {},
): void {
  answerWith(response, { status: 200, type: 'text/html; charset=utf-8', body: html, headers });
}

/** After a form is sent: see-other, so that reloading the page does not send it again. */
export function redirectTo(response: ServerResponse, location: string): void {
  response.writeHead(303, { location, 'cache-control': 'no-store' });
  response.end();
}
