import { primary, replica } from '@/db/pools';
import { checkReadiness } from '@/lib/readiness/check-readiness';

/** For a load balancer: 503 while anything this server needs does not answer. */
export async function answerReady(): Promise<Response> {
  const readiness = await checkReadiness(primary(), replica());
  return Response.json(readiness, {
    status: readiness.ready ? 200 : 503,
    headers: { 'cache-control': 'no-store' },
  });
}
