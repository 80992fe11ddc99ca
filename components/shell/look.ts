/** By day, by night, or as the device is set. The value is the class of the body. */
export const LOOKS = ['device', 'day', 'night'] as const;
export type Look = (typeof LOOKS)[number];

export const LOOK_COOKIE = 'lw-look';
/** Single keys can be switched off, for those who speak to their machine or rest a hand on the keys. */
export const KEYS_COOKIE = 'lw-keys';

export function readLook(stored: string | undefined): Look {
  return LOOKS.find((look) => look === stored) ?? 'device';
}

export function readSingleKeys(stored: string | undefined): boolean {
  return stored !== 'off';
}
