/** When a price counts as stale: after so many hours, not counting whole days on which none is set. */
export interface StaleRule {
  afterHours: number;
  /** Days of the week without a price, 0 (Sunday) … 6, by the calendar of UTC. */
  idleWeekdays: readonly number[];
}

export const defaultStaleRule: StaleRule = { afterHours: 36, idleWeekdays: [0, 6] };

/** The market's own rule, by its settings. */
export const staleRuleOf = ({ PRICE_STALE_HOURS }: { PRICE_STALE_HOURS: number }): StaleRule => ({
  ...defaultStaleRule,
  afterHours: PRICE_STALE_HOURS,
});

const hourMs = 3_600_000;
const dayMs = 24 * hourMs;

/** Whether a price set at `at` is stale at `now` (rules.md, Sale terms). */
export function isStale(at: Date, now: Date, { afterHours, idleWeekdays }: StaleRule = defaultStaleRule): boolean {
  let ageMs = 0;
  for (let from = at.getTime(); from < now.getTime() && ageMs <= afterHours * hourMs;) {
    const endOfDay = (Math.floor(from / dayMs) + 1) * dayMs;
    const to = Math.min(endOfDay, now.getTime());
    if (!idleWeekdays.includes(new Date(from).getUTCDay())) ageMs += to - from;
    from = to;
  }
  return ageMs > afterHours * hourMs;
}
