import { profileChange, type OwnMember } from '@lydite/contracts';
import { Button, ErrorSummary, TextField } from '@lydite/ui';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { z } from 'zod';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { sessionKey } from '../session/session.queries.ts';
import { announce } from '../shell/announce.ts';
import { AccountSection } from './AccountSection.tsx';
import { RolesField } from './RolesField.tsx';

type Profile = z.infer<typeof profileChange>;

const ownRoles = ['seller', 'buyer'] as const;

export function ProfileForm({ member }: { member: OwnMember }) {
  const cache = useQueryClient();
  const [isSaved, setSaved] = useState(false);
  const { field, submit, problems, refusal, isSending } = useRequestForm<Profile>({
    schema: profileChange,
    start: {
      name: member.name,
      place: member.place,
      roles: ownRoles.filter((role) => member.roles.includes(role)),
    },
    send: async (body) => {
      await call('PUT /members/me', { body });
      await cache.invalidateQueries({ queryKey: sessionKey });
      setSaved(true);
      announce('Your profile is saved.', { own: true });
    },
  });
  const { error: rolesError, id: _, ...roles } = field('roles');
  return (
    <AccountSection title="Profile">
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} onChange={() => setSaved(false)} noValidate className="fields mt-4 max-w-md">
        <TextField {...field('name')} label="Firm, or your own name" autoComplete="organization" />
        <TextField {...field('place')} label="Town" autoComplete="address-level2" />
        <RolesField error={rolesError} input={roles} />
        <Refusal>{refusal}</Refusal>
        <div className="flex items-center gap-4">
          <Button type="submit" busy={isSending && 'Saving'}>
            Save the profile
          </Button>
          {isSaved && <span className="mute">Saved</span>}
        </div>
      </form>
    </AccountSection>
  );
}
