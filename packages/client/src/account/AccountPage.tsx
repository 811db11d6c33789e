import { FactList, Page } from '@lydite/ui';
import { useWords } from '../market/use-words.ts';
import { useMember } from '../session/session.queries.ts';
import { useTitle } from '../shell/use-title.ts';
import { PasswordForm } from './PasswordForm.tsx';
import { ProfileForm } from './ProfileForm.tsx';
import { SecondStep } from './SecondStep.tsx';
import { SessionList } from './SessionList.tsx';
import { ThemeChoice } from './ThemeChoice.tsx';

export function Component() {
  const member = useMember();
  const { money } = useWords();
  useTitle('Account');
  if (!member) return null;
  const buys = member.roles.includes('buyer');
  return (
    <Page shape="narrow">
      <h1>Account</h1>
      <div className="mt-4">
        <FactList
          facts={[
            { name: 'E-mail', value: member.email },
            {
              name: 'Papers',
              value: member.verified
                ? 'Identity and licence papers were seen by the desk'
                : 'Not seen by the desk yet; they are needed before the first payout',
            },
            ...(buys
              ? [{ name: 'Buying limit', value: `${money(member.limitMinor)} of bids and unpaid awards at a time` }]
              : []),
          ]}
        />
      </div>
      <ProfileForm member={member} />
      <PasswordForm />
      <SecondStep />
      <SessionList />
      <ThemeChoice />
    </Page>
  );
}
