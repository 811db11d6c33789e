export { startMail, type MailOptions, type RunningMail } from './mail/server.ts';
export { startPayments, type PaymentsOptions } from './payments/server.ts';
export { startPrices, type PricesOptions } from './prices/server.ts';
export type { Running } from './listen.ts';
