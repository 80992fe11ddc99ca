import { stackSettings } from '@/lib/stack/settings';

const { ports } = stackSettings('test', process.env, process.cwd());
/** Beside those of the stack, which may be up. */
const BESIDE = 101;

export const DOOR_PORT = ports.web + BESIDE;
export const WORKER_PORT = ports.worker + BESIDE;
export const DATABASE_PORT = ports.database + BESIDE;
export const DOOR = `http://127.0.0.1:${DOOR_PORT}`;
/** Of the stack's own mail server. */
export const INBOX = `http://127.0.0.1:${ports.inbox}`;
