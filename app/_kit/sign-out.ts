'use server';
import { signOut } from './auth';

/** Ends this browser's session. */
export async function signOutHere(): Promise<void> {
  await signOut({ redirectTo: '/sign-in' });
}
