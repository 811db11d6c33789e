import { Button, TextField } from '@lydite/ui';
import { useEffect, useRef, useState, type FormEvent } from 'react';
import { call } from '../call/call.ts';
import { registerPasswordDialog } from '../session/fresh-call.ts';

/** Asks for the password again before money moves. */
export function PasswordDialog() {
  const dialog = useRef<HTMLDialogElement>(null);
  const settle = useRef<{ resolve: () => void; reject: (error: Error) => void } | null>(null);
  const [error, setError] = useState<string | null>(null);
  const [password, setPassword] = useState('');

  useEffect(
    () =>
      registerPasswordDialog(
        () =>
          new Promise((resolve, reject) => {
            settle.current = { resolve, reject };
            setError(null);
            setPassword('');
            dialog.current?.showModal();
          }),
      ),
    [],
  );

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    try {
      await call('POST /session/password', { body: { password } });
      settle.current?.resolve();
      settle.current = null;
      dialog.current?.close();
    } catch (refusal) {
      setError((refusal as Error).message);
    }
  };

  const closed = () => {
    settle.current?.reject(new Error('Nothing was done: the password was not entered.'));
    settle.current = null;
  };

  return (
    <dialog ref={dialog} className="dialog" aria-labelledby="password-title" onClose={closed}>
      <form onSubmit={(event) => void submit(event)}>
        <h2 id="password-title">Enter your password again</h2>
        <p className="small mute">Money moves with the next step. We ask once in ten minutes.</p>
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          value={password}
          error={error}
          onChange={(event) => setPassword(event.target.value)}
        />
        <div className="actions">
          <Button look="primary" type="submit">
            Go on
          </Button>
          <Button look="quiet" type="button" onClick={() => dialog.current?.close()}>
            Not now
          </Button>
        </div>
      </form>
    </dialog>
  );
}
