/** What parts are put into. An oven is what ages and bakes; a furnace also solution treats and hardens. */
export const EQUIPMENT_KINDS = ['furnace', 'oven', 'tank'] as const;
export type EquipmentKind = (typeof EQUIPMENT_KINDS)[number];
