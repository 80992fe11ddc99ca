import { SINGLE_KEYS_EVENT } from '@/components/ui/keys';
import { KEYS_COOKIE, type Look, LOOK_COOKIE, LOOKS } from './look';

const A_YEAR_S = 31_536_000;

/** Kept in the browser, because one person works by day at a desk and by night at the furnace. */
export function keepLook(look: Look): void {
  keep(LOOK_COOKIE, look);
  document.body.classList.remove(...LOOKS);
  document.body.classList.add(look);
}

export function keepSingleKeys(on: boolean): void {
  keep(KEYS_COOKIE, on ? 'on' : 'off');
  window.dispatchEvent(new CustomEvent(SINGLE_KEYS_EVENT, { detail: on }));
}

function keep(name: string, value: string) {
  const secure = window.location.protocol === 'https:' ? '; secure' : '';
  document.cookie = `${name}=${value}; path=/; max-age=${A_YEAR_S}; samesite=lax${secure}`;
}
