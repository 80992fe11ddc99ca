import { hash, verify } from '@node-rs/argon2';

// Compared when the account does not exist, so that the time of the answer does not tell which accounts do.
const NOBODYS_HASH =
  '$argon2id$v=19$m=19456,t=2,p=1$Y1iT+t7lfPSyA+EcCNSCIw$HFhOVU2vJHwzjzqZrhDZWNFfLbnco/axpeoVH8+eWp0';

/** argon2id with the library's defaults: 19 MiB, two passes, one lane. */
export const hashPassword = (password: string): Promise<string> => hash(password);

/** Takes the same time whether there is a password to compare with or not. */
export async function isPassword(stored: string | null | undefined, password: string): Promise<boolean> {
  const right = await verify(stored ?? NOBODYS_HASH, password).catch(() => false);
  return right && stored != null;
}
