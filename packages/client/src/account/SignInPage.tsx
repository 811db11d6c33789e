import { Button, Page, TextField } from '@lydite/ui';
import { useState, type FormEvent } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { isApiError } from '../call/api-error.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useSignIn } from '../session/session.queries.ts';
import { otherHome, useApp } from '../shell/app-context.ts';
import { useTitle } from '../shell/use-title.ts';
import { DemoSignIns, MailboxLink } from './DemoHelp.tsx';
import { safeNext } from './safe-next.ts';
import { SecondStepField } from './SecondStepField.tsx';
import { takeFocus } from './take-focus.ts';

export function Component() {
  const signIn = useSignIn();
  const navigate = useNavigate();
  const { app } = useApp();
  const [search] = useSearchParams();
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [code, setCode] = useState('');
  const [wantsCode, setWantsCode] = useState(false);
  const asksForCode = isApiError(signIn.error, 'session.code_required');
  useTitle('Sign in', { invalid: signIn.isError && !asksForCode });

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const next = search.get('next');
    signIn.mutate(
      { email: email.trim(), password, ...(wantsCode && code.trim() ? { code: code.trim() } : {}) },
      {
        onError: (error) => {
          if (isApiError(error, 'session.code_required')) setWantsCode(true);
          if (isApiError(error, 'session.code_wrong')) setCode('');
        },
        onSuccess: ({ member }) => {
          const elsewhere = next || !member ? null : otherHome(app, member.roles);
          if (elsewhere) location.assign(elsewhere);
          else void navigate(safeNext(next), { replace: true });
        },
      },
    );
  };

  return (
    <Page shape="narrow">
      <h1>Sign in</h1>
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <TextField
          id="email"
          label="E-mail"
          type="email"
          autoComplete="username"
          value={email}
          onChange={(event) => setEmail(event.target.value)}
        />
        <TextField
          id="password"
          label="Password"
          type="password"
          autoComplete="current-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
        />
        {wantsCode && (
          <SecondStepField id="code" ref={takeFocus} value={code} onChange={(event) => setCode(event.target.value)} />
        )}
        <Refusal>{asksForCode ? null : signIn.error?.message}</Refusal>
        {isApiError(signIn.error, 'session.email_unconfirmed') && <MailboxLink />}
        <Button look="primary" type="submit" className="justify-self-start" busy={signIn.isPending && 'Signing in'}>
          Sign in
        </Button>
      </form>
      <p className="mt-6 flex flex-wrap gap-x-6 gap-y-2">
        <Link to="/forgot">Forgot the password?</Link>
        <Link to="/register">Register</Link>
      </p>
      <DemoSignIns onChoose={setEmail} />
    </Page>
  );
}
