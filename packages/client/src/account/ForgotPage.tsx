import { resetRequest } from '@lydite/contracts';
import { Button, ErrorSummary, Page, TextField } from '@lydite/ui';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { useTitle } from '../shell/use-title.ts';
import { MailboxLink } from './DemoHelp.tsx';

export function Component() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  useTitle(sentTo ? 'Look into your mail' : 'Forgot the password');
  const { field, submit, problems, refusal, isSending } = useRequestForm<{ email: string }>({
    schema: resetRequest,
    start: { email: '' },
    send: async (body) => {
      await call('POST /password-resets', { body });
      setSentTo(body.email);
    },
  });
  if (sentTo)
    return (
      <Page shape="narrow">
        <h1>Look into your mail</h1>
        <div className="mt-4 grid gap-4" role="status">
          <p className="say">
            If <b>{sentTo}</b> has an account, a link to set a new password is on its way. It works for an hour.
          </p>
          <MailboxLink />
        </div>
      </Page>
    );
  return (
    <Page shape="narrow">
      <h1>Forgot the password?</h1>
      <p className="lead">We send you a link to set a new one. Your password stays as it is until then.</p>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
        <Refusal>{refusal}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Sending'}>
          Send the link
        </Button>
      </form>
      <p className="mt-6">
        <Link to="/sign-in">Back to sign in</Link>
      </p>
    </Page>
  );
}
