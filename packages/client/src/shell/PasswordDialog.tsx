import { Button, TextField } from '@lydite/ui';
import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef, useState, type FormEvent } from 'react';
import { call } from '../call/call.ts';
import { registerPasswordDialog } from '../session/fresh-call.ts';

/** Asks for the password again before money moves. Empty while closed, so that a page never has a second password field. */
export function PasswordDialog() {
  const dialog = useRef<HTMLDialogElement>(null);
  const settle = useRef<{ resolve: () => void; reject: (error: Error) => void } | null>(null);
  const [isOpen, setOpen] = useState(false);
  const [password, setPassword] = useState('');
  const { mutate, reset, error, isPending } = useMutation({
    mutationFn: () => call('POST /session/password', { body: { password } }),
    onSuccess: () => {
      settle.current?.resolve();
      settle.current = null;
      dialog.current?.close();
    },
  });

  useEffect(
    () =>
      registerPasswordDialog(
        () =>
          new Promise((resolve, reject) => {
            settle.current = { resolve, reject };
            reset();
            setPassword('');
            setOpen(true);
            dialog.current?.showModal();
          }),
      ),
    [reset],
  );

  const submit = (event: FormEvent) => {
    event.preventDefault();
    mutate();
  };

  const closed = () => {
    setOpen(false);
    settle.current?.reject(new Error('Nothing was done: the password was not entered.'));
    settle.current = null;
  };

  return (
    <dialog ref={dialog} className="dialog" aria-labelledby="password-title" onClose={closed}>
      {isOpen && (
        <form onSubmit={submit} className="fields">
          <div>
            <h2 id="password-title">Enter your password again</h2>
            <p className="small mute">Money moves with the next step. We ask once in ten minutes.</p>
          </div>
          <TextField
            label="Password"
            type="password"
            autoComplete="current-password"
            value={password}
            error={error?.message ?? null}
            onChange={(event) => setPassword(event.target.value)}
          />
          <div className="flex gap-3">
            <Button look="primary" type="submit" busy={isPending && 'Checking'}>
              Go on
            </Button>
            <Button look="quiet" type="button" onClick={() => dialog.current?.close()}>
              Not now
            </Button>
          </div>
        </form>
      )}
    </dialog>
  );
}
