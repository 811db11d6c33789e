import { totpCodeRequest, type TotpCodeRequest, type TotpSetup } from '@lydite/contracts';
import { Button, ErrorSummary, TextField } from '@lydite/ui';
import { useMutation } from '@tanstack/react-query';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { withFreshPassword } from '../session/fresh-call.ts';
import { SetupCode } from './SetupCode.tsx';

type OnSetUp = (recoveryCodes: string[]) => Promise<void>;

export function SetUpSecondStep({ onSetUp }: { onSetUp: OnSetUp }) {
  const begin = useMutation({ mutationFn: () => withFreshPassword(() => call('POST /my/totp')) });
  return (
    <>
      <p className="mt-2">
        Besides the password, signing in can ask for a code that an authenticator app on your phone shows.
      </p>
      {begin.data ? (
        <ConfirmSetup setup={begin.data} onSetUp={onSetUp} />
      ) : (
        <div className="mt-4 grid justify-items-start gap-4">
          <Refusal>{begin.error?.message}</Refusal>
          <Button busy={begin.isPending && 'Preparing'} onClick={() => begin.mutate()}>
            Set up the second step
          </Button>
        </div>
      )}
    </>
  );
}

function ConfirmSetup({ setup, onSetUp }: { setup: TotpSetup; onSetUp: OnSetUp }) {
  const { field, submit, problems, refusal, isSending } = useRequestForm<TotpCodeRequest>({
    schema: totpCodeRequest,
    start: { code: '' },
    send: async (body) => onSetUp((await call('POST /my/totp/confirm', { body })).recoveryCodes),
  });
  return (
    <>
      <SetupCode setup={setup} />
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-4 max-w-md">
        <TextField
          {...field('code')}
          label="Code the app shows now"
          hint="Six digits."
          autoComplete="one-time-code"
          inputMode="numeric"
        />
        <Refusal>{refusal}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Checking'}>
          Turn the second step on
        </Button>
      </form>
    </>
  );
}
