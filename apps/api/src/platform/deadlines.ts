import { DateTime } from 'luxon';
import type { EntityManager } from 'typeorm';
import { marketTerms } from './market-terms.ts';

/** Days of the market on which nothing falls due, as `2026-12-25`. */
export type Holidays = ReadonlySet<string>;

interface CalendarSpan {
  from: Date;
  /** Calendar days in the market's zone, 0 or more. */
  days: number;
  /** IANA zone of the market. */
  zone: string;
  holidays: Holidays;
}

const closingHour = 18;
const friday = 5;

/**
 * When a deadline of so many calendar days ends: at 18:00 in the market's zone, moved off weekends and holidays to the
 * next working day (rules.md, Deadlines). At 18:00:00 it is late.
 */
export function calendarDeadline({ from, days, zone, holidays }: CalendarSpan): Date {
  let day = DateTime.fromJSDate(from, { zone }).startOf('day').plus({ days });
  while (day.weekday > friday || holidays.has(day.toISODate()!)) day = day.plus({ days: 1 });
  return day.set({ hour: closingHour }).toJSDate();
}

export async function loadHolidays(tx: EntityManager): Promise<Holidays> {
  const rows: { day: string }[] = await tx.query('select day::text from holidays');
  return new Set(rows.map(({ day }) => day));
}

/** The same with the market's own zone and holidays. */
export async function deadlineAfter(tx: EntityManager, { from, days }: { from: Date; days: number }): Promise<Date> {
  const { zone } = await marketTerms(tx);
  return calendarDeadline({ from, days, zone, holidays: await loadHolidays(tx) });
}
