import { Refusal, useWords } from '@lydite/client';
import type { PayoutAccount } from '@lydite/contracts';
import { Button } from '@lydite/ui';
import { useSetUpPayouts } from '../payouts.queries.ts';

interface Task {
  name: string;
  state: string;
  isDone: boolean;
}

/** What stands between a seller and the first payout, done or not. */
export function payoutTasks({ state, requirements, verified }: PayoutAccount): Task[] {
  const asked: Task[] =
    state === 'none'
      ? [{ name: 'Open an account with the payment processor', state: 'Not started', isDone: false }]
      : requirements.map((name) => ({ name, state: 'The payment processor asks for it', isDone: false }));
  const account: Task[] =
    state === 'ready'
      ? [{ name: 'Account with the payment processor', state: 'Ready', isDone: true }]
      : asked.length > 0
        ? asked
        : [{ name: 'Account with the payment processor', state: 'Being checked by the processor', isDone: false }];
  const papers: Task = {
    name: 'Identity and licence papers',
    state: verified ? 'Seen by the desk' : 'The desk still has to see them',
    isDone: verified,
  };
  return [...account, papers];
}

/** The account money is paid out to: its state, what is still asked for, and what waits for it. */
export function AccountState({ account }: { account: PayoutAccount }) {
  const { exactMoney } = useWords();
  const setUp = useSetUpPayouts();
  const { state, waitingMinor, verified } = account;
  const isReady = state === 'ready' && verified;
  return (
    <section aria-labelledby="payout-account">
      <h2 id="payout-account">{isReady ? 'Your payouts are set up' : 'Before your first payout'}</h2>
      <ul className="ruled ruled-head mt-2 pt-0!">
        {payoutTasks(account).map(({ name, state: word, isDone }) => (
          <li key={name} className="flex flex-wrap justify-between gap-x-4">
            <span>{name}</span>
            <span className={isDone ? 'small mute' : 'small font-medium'}>{word}</span>
          </li>
        ))}
      </ul>
      {waitingMinor > 0 && (
        <p className="say mt-4">
          <b>{exactMoney(waitingMinor)}</b> of settled lots waits
          {isReady ? ' and is on its way.' : ' and is sent by itself once the above is done.'}
        </p>
      )}
      <p className="small mute mt-4 max-w-[60ch]">
        Bank data is entered on the payment processor’s own page and stays there; the market never sees it.
      </p>
      <Refusal>{setUp.error?.message}</Refusal>
      <div className="actions">
        <Button
          look={state === 'ready' ? 'plain' : 'primary'}
          busy={(setUp.isPending || setUp.isSuccess) && 'Opening the processor’s page'}
          onClick={() => setUp.mutate()}
        >
          {state === 'none' ? 'Set up payouts' : state === 'ready' ? 'Change bank or details' : 'Go on with the set-up'}
        </Button>
      </div>
    </section>
  );
}
