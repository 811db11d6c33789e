import { resetCompletion } from '@lydite/contracts';
import { Button, ErrorSummary, Page } from '@lydite/ui';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { useTitle } from '../shell/use-title.ts';
import { NewPasswordField } from './NewPasswordField.tsx';

const newPassword = resetCompletion.pick({ password: true });

export function Component() {
  const token = useSearchParams()[0].get('token') ?? '';
  const [isDone, setDone] = useState(false);
  useTitle(isDone ? 'Password set' : 'Set a new password');
  const { field, submit, problems, refusal, isSending } = useRequestForm<{ password: string }>({
    schema: newPassword,
    start: { password: '' },
    send: async ({ password }) => {
      await call('POST /password-resets/complete', { body: { token, password } });
      setDone(true);
    },
  });
  if (isDone)
    return (
      <Page shape="narrow">
        <h1>Your new password is set</h1>
        <p className="say mt-4" role="status">
          All your sessions have ended. Sign in with the new password.
        </p>
        <p className="actions">
          <Link to="/sign-in" className="btn btn-primary">
            Sign in
          </Link>
        </p>
      </Page>
    );
  return (
    <Page shape="narrow">
      <h1>Set a new password</h1>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <NewPasswordField {...field('password')} label="New password" />
        <Refusal>{token ? refusal : 'The link is not complete. Copy all of it from the mail.'}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Setting'}>
          Set the password
        </Button>
      </form>
      <p className="mt-6">
        <Link to="/forgot">Send another link</Link>
      </p>
    </Page>
  );
}
