import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { createOwnerSource } from '../data-source.ts';
import { openWorld } from '../open-world.ts';
import { MarketNotEmpty, seedMarket } from '../seeds/seed-market.ts';
import { readSettings } from '../settings.ts';

/** Plays the demo market into an empty database. The last line printed names the sign-ins, for whoever started it. */
export async function seed(): Promise<void> {
  const ownerUrl = process.env.DATABASE_OWNER_URL;
  if (!ownerUrl)
    throw new Error('Set DATABASE_OWNER_URL: the seed moves the market’s clock, which only the owner may.');
  const world = await openWorld(readSettings(process.env));
  const owner = await createOwnerSource(ownerUrl).initialize();
  try {
    const signIns = await seedMarket({ world, owner, photosFolder: photosFolder() });
    console.log(JSON.stringify({ signIns }));
  } catch (error) {
    if (!(error instanceof MarketNotEmpty)) throw error;
    console.error(error.message);
    process.exitCode = 1;
  } finally {
    await owner.destroy();
    await world.close();
  }
}

const photos = join('src', 'seeds', 'photos');

/** The photos stay beside their source; this file runs from there or from the build. */
function photosFolder(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, photos))) {
    if (dirname(folder) === folder) throw new Error(`There is no folder ${photos} above ${import.meta.url}`);
    folder = dirname(folder);
  }
  return join(folder, photos);
}
