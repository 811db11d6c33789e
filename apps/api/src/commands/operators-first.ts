import { nameFirstOperators } from '../features/members/operators-first.ts';
import { openWorld } from '../open-world.ts';
import { AppError } from '../platform/app-error.ts';
import { readSettings } from '../settings.ts';

/** Names the market's first two operators; the process ends with 1 when that is refused. */
export async function operatorsFirst(emails: string[]): Promise<void> {
  const world = await openWorld(readSettings(process.env));
  try {
    await nameFirstOperators(world, emails);
    console.log(`Operators: ${emails.join(' and ')}.`);
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    console.error(error.message);
    process.exitCode = 1;
  } finally {
    await world.close();
  }
}
