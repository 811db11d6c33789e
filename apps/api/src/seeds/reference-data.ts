import type { DataSource, EntityManager } from 'typeorm';
import { ensureCatalogue } from '../features/catalogue/catalogue.commands.ts';

/** Fees in hundredths of a per cent of the settled value (rules.md, Money), from a day on. */
const feeSchedules = [{ fromDay: '2025-01-01', buyerFeeBp: 200, sellerFeeBp: 400 }];

/** Days on which no deadline of the market ends; the desk adds later years. */
const fixedHolidays = [
  ['01-01', 'New Year’s Day'],
  ['05-01', 'May Day'],
  ['12-25', 'Christmas Day'],
  ['12-26', 'Second day of Christmas'],
] as const;
const easterMondays = ['2025-04-21', '2026-04-06', '2027-03-29', '2028-04-17', '2029-04-02', '2030-04-22'];

const holidays = easterMondays.flatMap((monday) => [
  { day: monday, name: 'Easter Monday' },
  ...fixedHolidays.map(([day, name]) => ({ day: `${monday.slice(0, 4)}-${day}`, name })),
]);

/** Puts in what every market needs before its first lot: catalogue, fees and holidays. Running it again changes nothing. */
export const ensureReferenceData = (owner: DataSource): Promise<void> =>
  owner.transaction(async (tx) => {
    await ensureCatalogue(tx);
    await ensureFees(tx);
    await ensureHolidays(tx);
  });

async function ensureFees(tx: EntityManager): Promise<void> {
  for (const { fromDay, buyerFeeBp, sellerFeeBp } of feeSchedules)
    await tx.query(
      'insert into fee_schedules (from_day, buyer_fee_bp, seller_fee_bp) values ($1, $2, $3) on conflict (from_day) do nothing',
      [fromDay, buyerFeeBp, sellerFeeBp],
    );
}

async function ensureHolidays(tx: EntityManager): Promise<void> {
  for (const { day, name } of holidays)
    await tx.query('insert into holidays (day, name) values ($1, $2) on conflict (day) do nothing', [day, name]);
}
