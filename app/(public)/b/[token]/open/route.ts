import { AuthError } from 'next-auth';

import { signIn } from '@/app/_kit/auth';
import { env } from '@/lib/env';

interface Route {
  params: Promise<{ token: string }>;
}

/** The one button of a link's page: a plain form, so it works without a script. Only a press comes here, never a look. */
export async function POST(request: Request, { params }: Route): Promise<Response> {
  const { token } = await params;
  const page = `/b/${encodeURIComponent(token)}`;
  // A foreign page could otherwise sign people in to a batch of its own choosing.
  const origin = request.headers.get('origin');
  if (origin !== null && origin !== new URL(env.APP_URL).origin) return seeOther(page);

  const at = (await request.formData().catch(() => null))?.get('at');
  try {
    await signIn('batch-link', { token, redirect: false });
  } catch (error) {
    // The page says which way the link has ended.
    if (error instanceof AuthError && error.type === 'CredentialsSignin') return seeOther(page);
    throw error;
  }
  return seeOther(`/portal${at === 'ask' ? '?at=ask' : ''}`);
}

export async function GET(_request: Request, { params }: Route): Promise<Response> {
  return seeOther(`/b/${encodeURIComponent((await params).token)}`);
}

const seeOther = (location: string): Response => new Response(null, { status: 303, headers: { location } });
