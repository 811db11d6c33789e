/** Lifetimes of a session in seconds; the documentation's table is tested against them. */
export const sessionLimits = {
  access: 10 * 60,
  fresh: 10 * 60,
  idle: { operator: 30 * 60, others: 8 * 3600 },
  absolute: { operator: 12 * 3600, others: 30 * 24 * 3600 },
} as const;
