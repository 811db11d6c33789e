import { DateTime } from 'luxon';
import type { DataSource } from 'typeorm';

/** The moments of the story, counted from the present in the market's zone. */
export interface Calendar {
  readonly now: DateTime;
  /** So many days ago at a time of day such as `9:40`. */
  ago: (days: number, time: string) => DateTime;
  hoursAgo: (hours: number) => DateTime;
  /** The full hour that lies at least so many hours ahead; behind, for a negative number. */
  fullHour: (hours: number) => DateTime;
  /** A full hour of the day, so many days ahead. */
  ahead: (days: number, hour: number) => DateTime;
}

export function createCalendar({ now, zone }: { now: Date; zone: string }): Calendar {
  const present = DateTime.fromJSDate(now, { zone });
  return {
    now: present,
    ago(days, time) {
      const [hour = 0, minute = 0] = time.split(':').map(Number);
      return present.minus({ days }).set({ hour, minute, second: 0, millisecond: 0 });
    },
    hoursAgo: (hours) => present.minus({ hours }),
    fullHour: (hours) => present.startOf('hour').plus({ hours: hours + 1 }),
    ahead: (days, hour) => present.plus({ days }).startOf('day').set({ hour }),
  };
}

/** The market's clock in the hands of the owner of its tables; the application may only read it. */
export function createClock(owner: DataSource) {
  let isReleased = false;
  return {
    /** Sets the market's time back to where the story begins. */
    startAt: (moment: Date): Promise<unknown> =>
      owner.query('update market_clock set shift = $1::timestamptz - clock_timestamp()', [moment]),
    /** Moves the market's time on. It never goes back: a moment that has passed while acting stays passed. */
    moveTo: (moment: Date): Promise<unknown> =>
      owner.query('update market_clock set shift = greatest(shift, $1::timestamptz - clock_timestamp())', [moment]),
    /** From now on the market's time is the world's. */
    async release(): Promise<void> {
      await owner.query(`update market_clock set shift = interval '0'`);
      isReleased = true;
    },
    isReleased: (): boolean => isReleased,
  };
}
export type Clock = ReturnType<typeof createClock>;
