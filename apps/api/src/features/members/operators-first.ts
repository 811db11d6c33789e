import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';

const firstOperators = 2;

interface Candidate {
  id: string;
  isConfirmed: boolean;
}

/**
 * Makes two members the market's first operators; later ones are granted the role by two operators (rules.md, Members).
 * @throws AppError member.not_found, session.email_unconfirmed; member.role_missing when the market has its operators already
 */
export const nameFirstOperators = ({ db }: Pick<World, 'db'>, emails: readonly string[]): Promise<void> =>
  inTransaction(db, async (tx) => {
    const wanted = new Set(emails.map((email) => email.toLowerCase()));
    if (wanted.size !== firstOperators)
      throw new AppError('request.invalid', 'Name the e-mail addresses of two different members.');
    // Two runs at once come one after the other.
    await tx.query('lock table member_roles in share row exclusive mode');
    const candidates: string[] = [];
    for (const email of wanted) candidates.push(await candidateId(tx, email));
    await assertNoOthers(tx, candidates);
    for (const id of candidates) {
      await tx.query(`insert into member_roles (member_id, role) values ($1, 'operator') on conflict do nothing`, [id]);
      await audit(tx, null, {
        action: 'member.grant_operator',
        objectKind: 'member',
        objectId: id,
        reason: 'one of the first two operators, named on the server',
      });
    }
  });

async function candidateId(tx: EntityManager, email: string): Promise<string> {
  const rows: Candidate[] = await tx.query(
    `select id, email_confirmed_at is not null as "isConfirmed" from members where email = $1 and suspended_at is null`,
    [email],
  );
  const member = rows[0];
  if (!member) throw new AppError('member.not_found', `${email} is no member. Register that address first.`);
  if (!member.isConfirmed)
    throw new AppError('session.email_unconfirmed', `${email} has not confirmed its address yet.`);
  return member.id;
}

async function assertNoOthers(tx: EntityManager, candidates: readonly string[]): Promise<void> {
  const rows: { id: string }[] = await tx.query(`select member_id as id from member_roles where role = 'operator'`);
  const all = new Set([...candidates, ...rows.map(({ id }) => id)]);
  if (rows.length >= firstOperators || all.size > firstOperators)
    throw new AppError(
      'member.role_missing',
      'The market has its first operators. Further ones are named by two of them.',
    );
}
