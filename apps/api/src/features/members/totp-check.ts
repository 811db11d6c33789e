import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { hasSecondStep } from '../../platform/session.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { noteFailure, takeBack } from './throttle.ts';
import { spendAppCode, spendRecoveryCode } from './totp-codes.ts';
import type { Seal } from './totp-secret.ts';

type Parts = Pick<World, 'db'> & { seal: Seal };

interface Check {
  memberId: string;
  code: string | undefined;
  /** The records of this try: see beginTry. */
  tries: readonly string[];
}

/**
 * Asks the second step of a member who has one; uses up the code. A wrong one slows down like a wrong password.
 * @throws AppError session.code_required, session.code_wrong
 */
export async function checkSecondStep({ db, seal }: Parts, { memberId, code, tries }: Check): Promise<void> {
  if (!(await hasSecondStep(db.manager, memberId))) return;
  if (!code) {
    // Nothing was guessed. The account's other failures stay, or asking without a code would reset the brake.
    await takeBack(db, tries);
    throw new AppError('session.code_required', 'Enter the code of your authenticator app, or a recovery code.');
  }
  const isRight = await inTransaction(db, async (tx) => {
    if (await spendAppCode(tx, seal, { memberId, code })) return true;
    const isRecovery = await spendRecoveryCode(tx, { memberId, code });
    const action = isRecovery ? 'session.recovery_code' : 'session.code_refused';
    await audit(tx, null, { action, objectKind: 'member', objectId: memberId });
    return isRecovery;
  });
  if (isRight) return;
  await noteFailure(db, tries);
  throw new AppError('session.code_wrong', 'This code is not right, or was used already. Wait for the next one.');
}
