'use server';
import { CredentialsSignin } from 'next-auth';
import { cookies } from 'next/headers';
import { redirect } from 'next/navigation';

import type { SignInState } from '@/components/people/sign-in-state';
import { primary } from '@/db/pools';
import { countOrganisations } from '@/lib/people/choose-organisation';
import { safeNext } from '@/lib/people/safe-next';
import { waitWords } from '@/lib/people/throttle';

import { signIn } from './auth';
import { claimsOf } from './session';

/** E-mail and password from the form; works before any script has come. */
export async function signInWithForm(_before: SignInState, form: FormData): Promise<SignInState> {
  const email = textOf(form, 'email');
  const refusal = await tryToEnter('password', { email, password: textOf(form, 'password') });
  if (refusal) return { says: refusal, email };
  return redirect(await placeAfter(textOf(form, 'next')));
}

/** The button on the page of a mailed link: only a press uses the link up. */
export async function signInWithLink(_before: SignInState, form: FormData): Promise<SignInState> {
  const refusal = await tryToEnter('mailed-link', { token: textOf(form, 'token') });
  if (refusal) return { says: 'This link was used, or its time is over. Ask for another one.' };
  return redirect(await placeAfter(textOf(form, 'next')));
}

export async function workFor(_before: SignInState, form: FormData): Promise<SignInState> {
  const refusal = await tryToEnter('organisation', { membershipId: textOf(form, 'membershipId') });
  if (refusal) return { says: 'You do not work for this organisation any more. Choose another one.' };
  return redirect(safeNext(textOf(form, 'next')));
}

async function tryToEnter(provider: string, given: Record<string, string>): Promise<string | null> {
  try {
    await signIn(provider, { ...given, redirect: false });
    return null;
  } catch (error) {
    if (!(error instanceof CredentialsSignin)) throw error;
    const [, waitS] = /^wait-(\d+)$/.exec(error.code) ?? [];
    return waitS === undefined
      ? 'This e-mail and password do not belong together. Try again, or let us mail you a link.'
      : `That was too many tries to sign in. Wait ${waitWords(Number(waitS))}, then try again.`;
  }
}

/** Where the person was going; first to the choice, for somebody who works for more than one organisation. */
async function placeAfter(given: string): Promise<string> {
  const next = safeNext(given);
  const claims = await claimsOf(new Headers({ cookie: (await cookies()).toString() }));
  const several = claims?.kind === 'person' && (await countOrganisations(primary(), claims.userId)) > 1;
  return several ? `/sign-in/organisation?next=${encodeURIComponent(next)}` : next;
}

function textOf(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
