import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import { openApiOf } from '@/lib/api/openapi';
import { env } from '@/lib/env';

export const GET = (): Response => Response.json(openApiOf(ALL_ENDPOINTS, env.APP_URL));
