/** Roles of people in a shop. One person may hold several; `auditor` reads only. */
export const SHOP_ROLES = ['lead', 'inspector', 'office', 'admin', 'auditor'] as const;
export type ShopRole = (typeof SHOP_ROLES)[number];

export const ROLES = [...SHOP_ROLES, 'processor'] as const;
export type Role = (typeof ROLES)[number];
