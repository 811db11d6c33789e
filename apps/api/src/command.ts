import { ledgerCheck } from './commands/ledger-check.ts';
import { operatorsFirst } from './commands/operators-first.ts';
import { seed } from './commands/seed.ts';
import { createOwnerSource } from './data-source.ts';
import { ensureReferenceData } from './seeds/reference-data.ts';

const usage = 'usage: command migrate | seed | ledger-check | operators-first MAIL MAIL';

async function migrate(): Promise<void> {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url) throw new Error('Set DATABASE_OWNER_URL: migrations run as the owner of the tables.');
  const owner = await createOwnerSource(url).initialize();
  const done = await owner.runMigrations();
  await ensureReferenceData(owner);
  await owner.destroy();
  console.log(done.length === 0 ? 'The schema is up to date.' : done.map((one) => `Ran ${one.name}.`).join('\n'));
}

const commands: Record<string, (args: string[]) => Promise<void>> = {
  migrate,
  seed,
  'ledger-check': ledgerCheck,
  'operators-first': operatorsFirst,
};

const [name = '', ...args] = process.argv.slice(2);
const command = commands[name];
if (!command) {
  console.error(usage);
  process.exit(2);
}
await command(args);
