import { totpCodeRequest, type TotpCodeRequest } from '@lydite/contracts';
import { Button, ErrorSummary } from '@lydite/ui';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { withFreshPassword } from '../session/fresh-call.ts';
import { SecondStepField } from './SecondStepField.tsx';

interface RemoveSecondStepProps {
  recoveryCodesLeft: number;
  onRemoved: () => Promise<void>;
}

export function RemoveSecondStep({ recoveryCodesLeft, onRemoved }: RemoveSecondStepProps) {
  const { field, submit, problems, refusal, isSending } = useRequestForm<TotpCodeRequest>({
    schema: totpCodeRequest,
    start: { code: '' },
    send: async (body) => {
      await withFreshPassword(() => call('POST /my/totp/remove', { body }));
      await onRemoved();
    },
  });
  return (
    <>
      <p className="mt-4">
        Signing in asks for a code of your authenticator app. Recovery codes left: {recoveryCodesLeft}.
      </p>
      <p className="small mute">
        For another device or new recovery codes, remove the second step and set it up again.
      </p>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-4 max-w-md">
        <SecondStepField {...field('code')} />
        <Refusal>{refusal}</Refusal>
        <Button type="submit" className="justify-self-start" busy={isSending && 'Removing'}>
          Remove the second step
        </Button>
      </form>
    </>
  );
}
