import { createHmac } from 'node:crypto';

import { env } from '@/lib/env';

/**
 * The key in a batch's link. Made from the link's id and the installation's secret, so that mail, code on the
 * traveller and a later rendering agree although the database holds nothing but the key's hash. After a change of the
 * secret, old links go on working (by their hash) and a new paper gets a new link.
 */
export const batchLinkToken = (linkId: string): string =>
  createHmac('sha256', env.AUTH_SECRET).update(`batch-link:${linkId}`).digest('base64url');

/** Where the link leads: says what it is for, and has one button. */
export const batchLinkUrl = (linkId: string): string => `${env.APP_URL}/b/${batchLinkToken(linkId)}`;
