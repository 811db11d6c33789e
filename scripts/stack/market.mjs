import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { dropDatabase, ensureDatabase, markDatabase, readMark } from '../postgres/database.mjs';

/** What a begun-anew stack forgets beside its database. */
const kept = ['fakes', 'files', 'webhooks.json', 'sign-ins.json'];

/**
 * Makes sure there is a database; begins anew when wished, or when an earlier seed was cut off half way.
 * Nothing else is ever dropped: a database without the mark may hold someone's own work.
 */
export function openMarket({ cluster, database, dir, fresh }) {
  ensureDatabase({ cluster, database });
  if (!fresh && readMark({ cluster, database }) !== 'seeding') return;
  dropDatabase({ cluster, database });
  for (const name of kept) rmSync(join(dir, name), { recursive: true, force: true });
  ensureDatabase({ cluster, database });
}

/** Seeds the demo market once, and keeps the sign-ins the seed prints as its last line. */
export async function seedOnce({ cluster, database, dir, runSeed }) {
  if (readMark({ cluster, database }) === 'seeded') return 'kept, checked';
  markDatabase({ cluster, database, word: 'seeding' });
  const signIns = readSignIns(await runSeed());
  writeFileSync(join(dir, 'sign-ins.json'), `${JSON.stringify(signIns, null, 2)}\n`);
  markDatabase({ cluster, database, word: 'seeded' });
  return 'seeded';
}

/** The demo sign-ins of this stack, as the seed printed them: a list of {role, email, password, app}. */
export function demoSignIns(dir) {
  const file = join(dir, 'sign-ins.json');
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : [];
}

function readSignIns(output) {
  const last = output.trimEnd().split('\n').at(-1) ?? '';
  try {
    return JSON.parse(last).signIns ?? [];
  } catch {
    return [];
  }
}
