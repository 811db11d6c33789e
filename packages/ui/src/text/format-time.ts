import { LOCALE } from './format-number.ts';

const dateParts: Intl.DateTimeFormatOptions = {
  weekday: 'short',
  day: 'numeric',
  month: 'short',
  hour: '2-digit',
  minute: '2-digit',
  hourCycle: 'h23',
  timeZoneName: 'short',
};

const formats = new Map<string, Intl.DateTimeFormat>();

function dateFormat(zone: string): Intl.DateTimeFormat {
  let format = formats.get(zone);
  if (!format) {
    format = new Intl.DateTimeFormat(LOCALE, { ...dateParts, timeZone: zone });
    formats.set(zone, format);
  }
  return format;
}

interface DateTimeFormat {
  /** Leaves the weekday, the zone or the time of day out. */
  weekday?: boolean;
  zone?: boolean;
  time?: boolean;
}

/**
 * A moment in words, always in the named zone: "Thu 4 Dec, 16:00 CET".
 * @param iso an ISO 8601 moment with offset
 * @param zone an IANA zone such as "Europe/Berlin"
 */
export function formatDateTime(iso: string, zone: string, show: DateTimeFormat = {}): string {
  const { weekday = true, zone: withZone = true, time = true } = show;
  const parts = dateFormat(zone).formatToParts(new Date(iso));
  const part = (type: Intl.DateTimeFormatPartTypes) => parts.find((one) => one.type === type)?.value ?? '';
  const day = `${weekday ? `${part('weekday')} ` : ''}${part('day')} ${part('month')}`;
  if (!time) return day;
  return `${day}, ${part('hour')}:${part('minute')}${withZone ? ` ${part('timeZoneName')}` : ''}`;
}

const MINUTE_MS = 60_000;

const counted = (count: number, noun: string) => `${count} ${noun}${count === 1 ? '' : 's'}`;

/** A length of time in its two largest units: "2 days 4 hours", "12 minutes", "less than a minute". */
export function formatDuration(lengthMs: number): string {
  const minutes = Math.floor(Math.abs(lengthMs) / MINUTE_MS);
  if (minutes === 0) return 'less than a minute';
  const units: [number, string][] = [
    [Math.floor(minutes / 1440), 'day'],
    [Math.floor((minutes % 1440) / 60), 'hour'],
    [minutes % 60, 'minute'],
  ];
  const first = units.findIndex(([count]) => count > 0);
  return units
    .slice(first, first + 2)
    .filter(([count]) => count > 0)
    .map(([count, noun]) => counted(count, noun))
    .join(' ');
}

/** How far a moment lies from now: "in 2 days 4 hours" or "3 minutes ago". */
export function formatRelative(iso: string, now: Date): string {
  const lengthMs = new Date(iso).getTime() - now.getTime();
  return lengthMs >= 0 ? `in ${formatDuration(lengthMs)}` : `${formatDuration(lengthMs)} ago`;
}
