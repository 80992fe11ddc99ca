import { createHmac } from 'node:crypto';

/** The signature header of the wire: `t=<seconds>,v1=<HMAC-SHA256 of "<seconds>.<body>">`. */
export function signWebhook(body: string, secret: string, atSeconds: number): string {
  const signature = createHmac('sha256', secret).update(`${atSeconds}.${body}`).digest('hex');
  return `t=${atSeconds},v1=${signature}`;
}
