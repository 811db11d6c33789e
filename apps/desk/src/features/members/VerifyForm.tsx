import { announce, Refusal, useMarket } from '@lydite/client';
import { useRequestForm } from '@lydite/client/form';
import { api, type DeskMember } from '@lydite/contracts';
import { Button, ErrorSummary, MoneyField, TextField } from '@lydite/ui';
import { Controller } from 'react-hook-form';
import { useVerifyMember, type Verification } from './members.queries.ts';

/** What an operator sets unless the papers say otherwise (rules.md, Members). */
const usualLimitMinor = 5_000_000;

export function VerifyForm({ member, onDone }: { member: DeskMember; onDone: () => void }) {
  const { currency } = useMarket();
  const verify = useVerifyMember(member.id);
  const { form, field, submit, problems, refusal, isSending } = useRequestForm<Verification>({
    schema: api['POST /desk/members/:memberId/verify'].body,
    start: { limitMinor: member.verifiedAt ? member.limitMinor : usualLimitMinor, reason: '' },
    send: async (body) => {
      await verify.mutateAsync(body);
      announce(`The papers of ${member.name} are entered.`, { own: true });
      onDone();
    },
  });
  return (
    <>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <TextField
          {...field('reason')}
          label="Papers you have seen"
          hint="Kinds, numbers and dates; they go into the audit log"
          autoComplete="off"
        />
        <Controller
          control={form.control}
          name="limitMinor"
          render={({ field: { value, onChange, onBlur }, fieldState: { error } }) => (
            <MoneyField
              id="limitMinor"
              label="Buying limit"
              hint="Bids led and unpaid awards together may not be above it"
              amountMinor={value}
              currency={currency}
              error={error && 'Enter an amount up to 999,999.99.'}
              onChange={onChange}
              onBlur={onBlur}
            />
          )}
        />
        <Refusal>{refusal}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Entering'}>
          {member.verifiedAt ? 'Change the limit' : 'Enter the papers'}
        </Button>
      </form>
    </>
  );
}
