/** What the history of one thing asks first; the page that prefetches it asks the same. */
export const historyOf = (entity: string, entityId: string) => ({ entity, entityId, limit: 20 });
