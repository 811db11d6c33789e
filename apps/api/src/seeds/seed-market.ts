import type { DataSource } from 'typeorm';
import { checkLedger } from '../features/ledger/ledger-check.ts';
import { takePrices } from '../features/prices/take-prices.ts';
import type { World } from '../platform/world.ts';
import { jobHandlers } from '../work.ts';
import { openAlbum } from './album.ts';
import { openBoards } from './lots/open-boards.ts';
import { openChips } from './lots/open-chips.ts';
import { openContacts } from './lots/open-contacts.ts';
import { paceWorld } from './paced-world.ts';
import { enrolFirms, signIns } from './people.ts';
import { playStories, type Story } from './play.ts';
import { createStage, type Stage } from './stage.ts';
import * as housekeeping from './stories/housekeeping.ts';
import { openLot } from './stories/open-lots.ts';
import * as settled from './stories/settled.ts';
import * as underWay from './stories/under-way.ts';
import * as unsold from './stories/unsold.ts';
import { createCalendar, createClock } from './time.ts';

const beginningDaysAgo = 45;

/** Every story of the demo market. They are played at once, in the order of the market's time. */
const storiesOf = (stage: Stage): Story[] => [
  ...[
    ...Object.values(housekeeping),
    ...Object.values(settled),
    ...Object.values(underWay),
    ...Object.values(unsold),
  ].map((tell) => tell(stage)),
  ...[openBoards, openContacts, openChips].flatMap((lots) => lots(stage.calendar)).map((lot) => openLot(stage, lot)),
];

interface SeedParts {
  world: World;
  /** A connection of the owner of the tables: only the owner may move the market's clock. */
  owner: DataSource;
  /** Where the rendered photos lie. */
  photosFolder: string;
}

/** The market is somebody's already. */
export class MarketNotEmpty extends Error {
  constructor() {
    super('This market has members already; the demo is played only into an empty one.');
  }
}

/**
 * Fills an empty market with its demo: six weeks of trade played through the market's own services, with its clock moved, and
 * the books proved at the end. Answers with one sign-in for each role.
 * @throws MarketNotEmpty; Error when the books are off at the end
 */
export async function seedMarket({ world, owner, photosFolder }: SeedParts): Promise<typeof signIns> {
  await assertEmpty(world);
  const clock = createClock(owner);
  const paced = paceWorld(world, clock);
  const album = openAlbum(paced, photosFolder);
  const calendar = createCalendar({ now: new Date(), zone: world.settings.MARKET_ZONE });
  try {
    await clock.startAt(calendar.ago(beginningDaysAgo, '8:00').toJSDate());
    await takePrices(paced);
    const stage = createStage({ world: paced, calendar, people: await enrolFirms(paced), album });
    const handlers = jobHandlers(paced);
    const { db } = world;
    await playStories({ db, clock, end: calendar.now, handlers, work: stage.work }, storiesOf(stage));
    await clock.release();
    await takePrices(paced);
    await stage.hear();
    await stage.work();
  } finally {
    await clock.release();
  }
  await assertBalanced(world);
  return signIns;
}

async function assertEmpty({ db }: World): Promise<void> {
  const rows: unknown[] = await db.query('select 1 from members limit 1');
  if (rows.length > 0) throw new MarketNotEmpty();
}

async function assertBalanced(world: World): Promise<void> {
  const { balanced, checks } = await checkLedger(world);
  const off = checks.filter(({ ok }) => !ok).map(({ name, detail }) => `${name}: ${detail}`);
  if (!balanced) throw new Error(`The books of the demo market are off.\n${off.join('\n')}`);
}
