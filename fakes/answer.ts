import type { ServerResponse } from 'node:http';

export function answerJson(response: ServerResponse, status: number, body: unknown, headers: Record<string, string> = {}): void {
  answerWith(response, status, 'application/json; charset=utf-8', JSON.stringify(body, null, 2), headers);
}

export function answerHtml(response: ServerResponse, status: number, html: string, headers: Record<string, string> = {}): void {
  answerWith(response, status, 'text/html; charset=utf-8', html, headers);
}

export function answerWith(
  response: ServerResponse,
  status: number,
  type: string,
  body: string | Buffer,
  headers: Record<string, string> = {},
): void {
  response.writeHead(status, { 'content-type': type, 'cache-control': 'no-store', 'x-content-type-options': 'nosniff', ...headers });
  response.end(body);
}

/** After a form is sent: see-other, so that reloading the page does not send it again. */
export function redirectTo(response: ServerResponse, location: string): void {
  response.writeHead(303, { location, 'cache-control': 'no-store' });
  response.end();
}
