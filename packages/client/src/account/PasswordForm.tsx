import { passwordChange } from '@lydite/contracts';
import { Button, ErrorSummary, TextField } from '@lydite/ui';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { z } from 'zod';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { announce } from '../shell/announce.ts';
import { sessionsQuery } from './account.queries.ts';
import { AccountSection } from './AccountSection.tsx';
import { NewPasswordField } from './NewPasswordField.tsx';

export function PasswordForm() {
  const cache = useQueryClient();
  const [isChanged, setChanged] = useState(false);
  const { form, field, submit, problems, refusal, isSending } = useRequestForm<z.infer<typeof passwordChange>>({
    schema: passwordChange,
    start: { currentPassword: '', newPassword: '' },
    send: async (body) => {
      await call('POST /password', { body });
      form.reset();
      setChanged(true);
      announce('Your password is changed.', { own: true });
      await cache.invalidateQueries({ queryKey: sessionsQuery.queryKey });
    },
  });
  return (
    <AccountSection title="Password">
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} onChange={() => setChanged(false)} noValidate className="fields mt-4 max-w-md">
        <TextField
          {...field('currentPassword')}
          label="Current password"
          type="password"
          autoComplete="current-password"
        />
        <NewPasswordField {...field('newPassword')} label="New password" />
        <Refusal>{refusal}</Refusal>
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit" busy={isSending && 'Changing'}>
            Change the password
          </Button>
          {isChanged && <span className="mute">Changed. All other sessions have ended.</span>}
        </div>
      </form>
    </AccountSection>
  );
}
