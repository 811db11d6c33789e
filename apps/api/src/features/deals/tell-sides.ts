import type { EntityManager } from 'typeorm';
import { notify } from '../notices/notices.commands.ts';
import type { LockedDeal } from './deal-steps.commands.ts';

interface Telling {
  /** Names the fact: it is told once per deal and side. */
  fact: string;
  subject: string;
  seller: string;
  buyer: string;
}

/** Tells both sides of a deal the same fact, each with what it means for them. */
export async function tellSides(
  tx: EntityManager,
  deal: LockedDeal,
  { fact, subject, seller, buyer }: Telling,
): Promise<void> {
  const sides = [
    { memberId: deal.sellerId, side: 'seller', text: seller, link: `/sell/deals/${deal.code}` },
    { memberId: deal.buyerId, side: 'buyer', text: buyer, link: `/deals/${deal.code}` },
  ];
  for (const { memberId, side, text, link } of sides)
    await notify(tx, { memberId, kind: fact, key: `${fact}:${deal.id}:${side}`, subject, text, link });
}

/** Tells every operator that a settlement still waits for approval. */
export async function tellOperators(tx: EntityManager, deal: LockedDeal): Promise<void> {
  const operators: { id: string }[] = await tx.query(
    `select member_id as id from member_roles where role = 'operator' order by member_id`,
  );
  for (const { id } of operators)
    await notify(tx, {
      memberId: id,
      kind: 'approval',
      key: `approval:${deal.id}:${id}`,
      subject: `${deal.code}: a settlement has waited two days for approval`,
      text: 'Its hold stays bound until an operator approves the settlement.',
      link: '/desk/deals',
    });
}
