import type { Response } from 'express';
import type { Html } from '../../pages/html.ts';
import { sendPage } from '../../pages/page.ts';

interface ShellInput {
  title: string;
  body: Html;
  status?: number;
  wide?: boolean;
  leadsTo?: (string | null | undefined)[];
}

/** A page of the processor. */
export function sendProcessorPage(res: Response, input: ShellInput): void {
  const owner = 'Payment processor (local stand-in)';
  sendPage(res, { owner, note: 'Test money only. Nothing here reaches a bank.', ...input });
}

/** Minor units as money, such as $1,234.50. */
export function moneyText(amountMinor: number, currency: string): string {
  const format = new Intl.NumberFormat('en-US', { style: 'currency', currency });
  return format.format(amountMinor / 10 ** (format.resolvedOptions().maximumFractionDigits ?? 2));
}

/** Seconds since the epoch as a date and time in UTC. */
export function timeText(atS: number): string {
  return `${new Date(atS * 1000).toISOString().slice(0, 19).replace('T', ' ')} UTC`;
}
