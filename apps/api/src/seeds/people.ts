import { randomUUID } from 'node:crypto';
import type { Role } from '@lydite/contracts';
import { createPasswords } from '../features/members/passwords.ts';
import { Member } from '../features/members/member.entity.ts';
import type { Actor } from '../platform/actor.ts';
import { audit } from '../platform/audit.ts';
import { inTransaction } from '../platform/transaction.ts';
import type { World } from '../platform/world.ts';

interface Firm {
  name: string;
  place: string;
  /** What stands before the demo's domain. */
  mailbox: string;
  roles: Role[];
  /** Buying limit in dollars once an operator has seen the papers; absent while nobody has. */
  limit?: number;
}

/** The firms of the invented district of Wendlesea: a place and a plain trade word. */
export const firms = {
  repairs: { name: 'Harrowmere Repairs', place: 'Harrowmere', mailbox: 'seller', roles: ['seller'], limit: 50_000 },
  recovery: { name: 'Vennaby Recovery', place: 'Vennaby', mailbox: 'buyer', roles: ['buyer'], limit: 50_000 },
  dismantling: {
    name: 'Sallowby Dismantling',
    place: 'Sallowby',
    mailbox: 'sallowby-dismantling',
    roles: ['seller'],
    limit: 50_000,
  },
  clearance: {
    name: 'Thrennaby Office Clearance',
    place: 'Thrennaby',
    mailbox: 'thrennaby-clearance',
    roles: ['seller'],
    limit: 50_000,
  },
  disposal: {
    name: 'Pellandsea Server Disposal',
    place: 'Pellandsea',
    mailbox: 'pellandsea-disposal',
    roles: ['seller'],
    limit: 50_000,
  },
  salvage: { name: 'Ossenmere Salvage', place: 'Ossenmere', mailbox: 'ossenmere-salvage', roles: ['seller'] },
  collectors: {
    name: 'Dunnowick Collectors',
    place: 'Dunnowick',
    mailbox: 'dunnowick-collectors',
    roles: ['seller', 'buyer'],
    limit: 10_000,
  },
  reclaim: {
    name: 'Harrowmere Reclaim',
    place: 'Harrowmere',
    mailbox: 'harrowmere-reclaim',
    roles: ['buyer'],
    limit: 50_000,
  },
  refining: {
    name: 'Ullerthwick Refining',
    place: 'Ullerthwick',
    mailbox: 'ullerthwick-refining',
    roles: ['buyer'],
    limit: 80_000,
  },
  trading: {
    name: 'Pellandsea Trading',
    place: 'Pellandsea',
    mailbox: 'pellandsea-trading',
    roles: ['buyer'],
    limit: 50_000,
  },
  works: {
    name: 'Ossenmere Works',
    place: 'Ossenmere',
    mailbox: 'ossenmere-works',
    roles: ['buyer', 'seller'],
    limit: 8_000,
  },
  laboratory: {
    name: 'Ullerthwick Assay Laboratory',
    place: 'Ullerthwick',
    mailbox: 'assayer',
    roles: ['assayer'],
    limit: 50_000,
  },
  desk: { name: 'Market desk, Harrowmere', place: 'Harrowmere', mailbox: 'operator', roles: [], limit: 2_000 },
  secondDesk: { name: 'Market desk, Vennaby', place: 'Vennaby', mailbox: 'operator-2', roles: [], limit: 2_000 },
} as const satisfies Record<string, Firm>;

export type FirmKey = keyof typeof firms;
export const firmKeys = Object.keys(firms) as FirmKey[];
export const firmOf = (key: FirmKey): Firm => firms[key];
export const emailOf = (key: FirmKey): string => `${firms[key].mailbox}@demo.lydite.example`;

export type People = Record<FirmKey, { id: string; place: string }>;

/** One password for all, so that a person trying the demo can change sides quickly. */
export const demoPassword = 'weigh-before-you-pay';

/** The sign-ins that the start prints, one for each role. */
export const signIns = (
  [
    ['seller', 'repairs'],
    ['buyer', 'recovery'],
    ['operator', 'desk'],
    ['assayer', 'laboratory'],
  ] as const
).map(([role, key]) => ({ role, email: emailOf(key), password: demoPassword }));

/** Enrols every firm with its address confirmed. The operators get their role by the command that names the first two. */
export async function enrolFirms({ db, settings }: Pick<World, 'db' | 'settings'>): Promise<People> {
  const passwordHash = await createPasswords({ pepper: settings.PASSWORD_PEPPER }).hash(demoPassword);
  const people: Partial<People> = {};
  await inTransaction(db, async (tx) => {
    for (const key of firmKeys) {
      const { name, place, roles } = firmOf(key);
      const id = randomUUID();
      const emailConfirmedAt = () => 'market_now()';
      await tx.insert(Member, { id, email: emailOf(key), passwordHash, name, place, emailConfirmedAt });
      for (const role of roles)
        await tx.query('insert into member_roles (member_id, role) values ($1, $2)', [id, role]);
      await audit(tx, null, { action: 'member.register', objectKind: 'member', objectId: id });
      people[key] = { id, place };
    }
  });
  return people as People;
}

/** A firm as the services see whoever calls them. */
export const actorOf = (people: People, key: FirmKey): Actor => ({
  id: people[key].id,
  sessionId: randomUUID(),
  roles: firmOf(key).roles,
  withheldRoles: [],
  ip: '127.0.0.1',
  requestId: randomUUID(),
});
