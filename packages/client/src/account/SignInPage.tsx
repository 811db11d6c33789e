import { Button, ErrorSummary, Page, TextField } from '@lydite/ui';
import { useState, type FormEvent } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { useSignIn } from '../session/session.queries.ts';
import { useTitle } from '../shell/use-title.ts';

/** Only a path of this client is followed: `?next=https://elsewhere` goes home. */
export const safeNext = (next: string | null): string => (next && /^\/(?![/\\])/.test(next) ? next : '/');

export function Component() {
  const signIn = useSignIn();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const failed = signIn.error?.message;
  useTitle('Sign in', { invalid: Boolean(failed) });

  const submit = (event: FormEvent) => {
    event.preventDefault();
    signIn.mutate(
      { email, password },
      { onSuccess: () => void navigate(safeNext(search.get('next')), { replace: true }) },
    );
  };

  return (
    <Page shape="narrow">
      <h1>Sign in</h1>
      {failed && <ErrorSummary problems={[{ message: failed, fieldId: 'email' }]} />}
      <form onSubmit={submit} noValidate className="mt-6 grid gap-5">
        <TextField
          id="email"
          label="E-mail"
          type="email"
          autoComplete="username"
          value={email}
          onChange={(event) => setEmail(event.target.value)}
        />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
        />
        <div className="actions">
          <Button look="primary" type="submit" busy={signIn.isPending && 'Signing in'}>
            Sign in
          </Button>
          <Link to="/forgot">Forgot the password?</Link>
          <Link to="/register">Register</Link>
        </div>
      </form>
    </Page>
  );
}
