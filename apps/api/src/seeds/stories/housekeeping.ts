import { verifyMember } from '../../features/desk/verify-member.ts';
import { nameFirstOperators } from '../../features/members/operators-first.ts';
import { createNoticesService } from '../../features/notices/notices.service.ts';
import { takePrices } from '../../features/prices/take-prices.ts';
import { setUpPayouts } from '../acts/selling.ts';
import { actorOf, emailOf, firmKeys, firmOf, type FirmKey } from '../people.ts';
import type { Story } from '../play.ts';
import type { Stage } from '../stage.ts';

const firstDay = 44;

/** A year of prices at the beginning, then each day's. */
export async function* prices(stage: Stage): Story {
  for (let day = firstDay; day >= 0; day -= 1) {
    const evening = stage.calendar.ago(day, '17:05');
    if (evening > stage.calendar.now) return;
    yield evening;
    await takePrices(stage.world);
  }
}

/** The first two operators are named, and see the papers of most members. */
export async function* papers(stage: Stage): Story {
  const { world, people, calendar } = stage;
  yield calendar.ago(firstDay, '11:00');
  await nameFirstOperators(world, [emailOf('desk'), emailOf('secondDesk')]);
  yield calendar.ago(firstDay - 1, '10:00');
  for (const key of firmKeys) {
    const { limit } = firmOf(key);
    if (limit === undefined) continue;
    const reason = 'Trade licence and register extract seen.';
    const verification = { memberId: people[key].id, limitMinor: limit * 100, reason };
    // Nobody sees to their own papers.
    await verifyMember(world, actorOf(people, key === 'desk' ? 'secondDesk' : 'desk'), verification);
  }
}

/** Sellers who have told the processor where to pay. */
const paidOut: readonly FirmKey[] = ['repairs', 'dismantling', 'clearance', 'disposal', 'salvage'];

export async function* payoutAccounts(stage: Stage): Story {
  for (const [index, key] of paidOut.entries()) {
    yield stage.calendar.ago(firstDay - 2, `14:${10 + index}`);
    await setUpPayouts(stage, key);
  }
}

/** The demo buyer's own figures: an invented small operator who sends out to be melted. */
export async function* buyingTerms(stage: Stage): Story {
  yield stage.calendar.ago(firstDay - 3, '20:15');
  await stage.bids.keepTerms(stage.people.recovery.id, {
    recoveryYield: 0.94,
    accountableShare: 0.97,
    processingPerKgMinor: 320,
    batchCostMinor: 3500,
    wantedChance: 0.8,
    marginShare: 0.1,
    rivals: 3,
    curseOn: true,
  });
}

/** The demo's members looked at their notices yesterday; what came since is unread. */
export async function* readNotices(stage: Stage): Story {
  yield stage.calendar.hoursAgo(20);
  const notices = createNoticesService(stage.world);
  for (const key of ['repairs', 'recovery', 'desk'] as const) await notices.markRead(actorOf(stage.people, key));
}
