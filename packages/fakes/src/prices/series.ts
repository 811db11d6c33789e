/** One reference price: the moment it was set and the price of a gram of fine gold. */
export interface ReferencePrice {
  at: string;
  perGram: number;
  currency: 'USD';
  source: 'Demo series';
}

const ZONE = 'Europe/London';
const SET_AT = ['10:30', '15:00'] as const;
const LEAST = 128;
const MOST = 134;

/** A repeatable number from −1 to 1 for a day and a slot: the same series on every machine. */
function noise(seed: number): number {
  let mixed = Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b);
  mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35);
  return (((mixed ^ (mixed >>> 16)) >>> 0) / 0xffffffff) * 2 - 1;
}

/** The invented price: slow waves and a little noise, within 128 and 134 dollars a gram, to the cent. */
function priceOf(dayNumber: number, slot: number): number {
  const at = dayNumber + slot * 0.4;
  const waves = 1.6 * Math.sin(at / 41) + 0.7 * Math.sin(at / 9.3 + 1) + 0.3 * Math.sin(at / 2.9);
  const price = 131 + waves + 0.3 * noise(dayNumber * 2 + slot);
  return Math.round(Math.min(MOST, Math.max(LEAST, price)) * 100) / 100;
}

const hourOf = new Intl.DateTimeFormat('en-GB', { timeZone: ZONE, hour: '2-digit', hourCycle: 'h23' });

/** The moment of a London wall-clock time: its summer hour is found by asking what noon UTC reads there. */
function londonMoment(day: string, time: string): Date {
  const aheadHours = Number(hourOf.format(new Date(`${day}T12:00:00Z`))) - 12;
  return new Date(Date.parse(`${day}T${time}:00Z`) - aheadHours * 3_600_000);
}

const DAY_MS = 86_400_000;

/** The reference prices from one moment to another, both included, oldest first: two on each weekday, none at weekends. */
export function referencePrices(from: Date, to: Date): ReferencePrice[] {
  const prices: ReferencePrice[] = [];
  const firstDay = Math.floor(from.getTime() / DAY_MS);
  for (let day = firstDay; day * DAY_MS <= to.getTime(); day += 1) {
    const date = new Date(day * DAY_MS);
    if ([0, 6].includes(date.getUTCDay())) continue;
    for (const [slot, time] of SET_AT.entries()) {
      const at = londonMoment(date.toISOString().slice(0, 10), time);
      if (at < from || at > to) continue;
      prices.push({ at: at.toISOString(), perGram: priceOf(day, slot), currency: 'USD', source: 'Demo series' });
    }
  }
  return prices;
}

/** The newest reference price at a moment; a weekend or an early morning gives the one before. */
export function latestPrice(now: Date): ReferencePrice {
  return referencePrices(new Date(now.getTime() - 5 * DAY_MS), now).at(-1)!;
}
