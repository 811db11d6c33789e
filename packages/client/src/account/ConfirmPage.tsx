import { Button, Page } from '@lydite/ui';
import { useMutation } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useTitle } from '../shell/use-title.ts';

/** A press confirms, not the visit: mail programs open links to look at them. */
export function Component() {
  const token = useSearchParams()[0].get('token') ?? '';
  const confirm = useMutation({ mutationFn: () => call('POST /members/confirm', { body: { token } }) });
  useTitle(confirm.isSuccess ? 'Address confirmed' : 'Confirm your address', { invalid: confirm.isError });
  if (confirm.isSuccess)
    return (
      <Page shape="narrow">
        <h1>Your address is confirmed</h1>
        <p className="say mt-4">You can sign in now.</p>
        <p className="actions">
          <Link to="/sign-in" className="btn btn-primary">
            Sign in
          </Link>
        </p>
      </Page>
    );
  return (
    <Page shape="narrow">
      <h1>Confirm your address</h1>
      <div className="mt-4 grid gap-5 justify-items-start">
        <p className="say">Press the button to confirm that this e-mail address is yours.</p>
        <Refusal>{token ? confirm.error?.message : 'The link is not complete. Copy all of it from the mail.'}</Refusal>
        {token && (
          <Button look="primary" busy={confirm.isPending && 'Confirming'} onClick={() => confirm.mutate()}>
            Confirm
          </Button>
        )}
      </div>
    </Page>
  );
}
