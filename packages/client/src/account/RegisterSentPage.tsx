import { Page } from '@lydite/ui';
import { Link, useLocation } from 'react-router-dom';
import { useTitle } from '../shell/use-title.ts';
import { MailboxLink } from './DemoHelp.tsx';

export function Component() {
  useTitle('Confirm your address');
  const { email } = (useLocation().state ?? {}) as { email?: string };
  return (
    <Page shape="narrow">
      <h1>Confirm your address</h1>
      <div className="mt-4 grid gap-4">
        <p className="say">
          We have sent a link to {email ? <b>{email}</b> : 'your address'}. Open it within a day and press the button on
          the page; then you can sign in.
        </p>
        <p className="mute">
          Nothing there? Look among unwanted mail, or <Link to="/sign-in">sign in</Link>: an account that is not
          confirmed yet gets its link once more.
        </p>
        <MailboxLink />
      </div>
    </Page>
  );
}
