const MS_PER_HOUR = 3_600_000;

/**
 * The last moment at which something may start that must start within some hours after another thing ended: the
 * relief bake after plating, tempering after the quench. The end of the earlier thing is the moment the last part
 * left the bath.
 *
 * Worked example: plating ended at 14:10, 4 hours allowed: the bake starts by 18:10.
 */
export const latestStart = (endedAt: Date, withinHours: number): Date =>
  new Date(endedAt.getTime() + withinHours * MS_PER_HOUR);
