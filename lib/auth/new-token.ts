import { randomBytes } from 'node:crypto';

/** A token for a link or a program: 256 bits that nobody guesses, in letters an address may carry. */
export const newToken = (prefix = ''): string => prefix + randomBytes(32).toString('base64url');
