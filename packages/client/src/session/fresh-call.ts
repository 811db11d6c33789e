import { isApiError } from '../call/api-error.ts';

type Ask = () => Promise<void>;
let ask: Ask | undefined;

/** The dialog that asks for the password registers itself here; it resolves once the password was right, rejects when closed. */
export function registerPasswordDialog(open: Ask): () => void {
  ask = open;
  return () => {
    ask = undefined;
  };
}

/** Runs a call that moves money; asks for the password when it was entered more than ten minutes ago, then runs it again. */
export async function withFreshPassword<T>(run: () => Promise<T>): Promise<T> {
  try {
    return await run();
  } catch (error) {
    if (!isApiError(error, 'session.stale') || !ask) throw error;
    await ask();
    return run();
  }
}
