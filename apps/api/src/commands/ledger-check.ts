import { checkLedger } from '../features/ledger/ledger-check.ts';
import { toReportText } from '../features/ledger/ledger-report.presenter.ts';
import { openWorld } from '../open-world.ts';
import { createWords } from '../platform/words.ts';
import { readSettings } from '../settings.ts';

/** Prints the proof of the books; the process ends with 1 when they are off. */
export async function ledgerCheck(): Promise<void> {
  const settings = readSettings(process.env);
  const world = await openWorld(settings);
  try {
    const report = await checkLedger(world);
    console.log(toReportText(report, createWords({ zone: settings.MARKET_ZONE, currency: settings.MARKET_CURRENCY })));
    process.exitCode = report.balanced ? 0 : 1;
  } finally {
    await world.close();
  }
}
