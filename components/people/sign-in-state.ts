/** What a sign-in form shows after a try. */
export interface SignInState {
  /** What is wrong, for the person; nothing before the first try. */
  says?: string;
  /** Kept as typed. */
  email?: string;
}

/** A server action of the sign-in pages. */
export type SignInAction = (before: SignInState, form: FormData) => Promise<SignInState>;
