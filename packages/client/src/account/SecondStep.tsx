import { useSuspenseQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { announce } from '../shell/announce.ts';
import { secondStepQuery, sessionsQuery } from './account.queries.ts';
import { AccountSection } from './AccountSection.tsx';
import { RecoveryCodes } from './RecoveryCodes.tsx';
import { RemoveSecondStep } from './RemoveSecondStep.tsx';
import { SetUpSecondStep } from './SetUpSecondStep.tsx';

/** A code of an authenticator app besides the password: set up, its recovery codes shown once, removed. */
export function SecondStep() {
  const { data } = useSuspenseQuery(secondStepQuery);
  const cache = useQueryClient();
  const [newCodes, setNewCodes] = useState<string[]>();

  const changed = async (text: string, codes?: string[]) => {
    setNewCodes(codes);
    announce(text, { own: true });
    // What was refused for want of a second step is asked for again.
    cache.removeQueries({ predicate: ({ state }) => state.status === 'error' });
    await Promise.all([cache.invalidateQueries(secondStepQuery), cache.invalidateQueries(sessionsQuery)]);
  };

  return (
    <AccountSection title="Second step at sign-in">
      {newCodes && <RecoveryCodes codes={newCodes} />}
      {data.isOn ? (
        <RemoveSecondStep
          recoveryCodesLeft={data.recoveryCodesLeft}
          onRemoved={() => changed('The second step is removed.')}
        />
      ) : (
        <SetUpSecondStep onSetUp={(codes) => changed('The second step is on. Keep your recovery codes.', codes)} />
      )}
    </AccountSection>
  );
}
