import type { SessionRow } from '@lydite/contracts';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Refusal } from '../form/Refusal.tsx';
import { useWords } from '../market/use-words.ts';
import { sessionsQuery, useEndSession } from './account.queries.ts';
import { AccountSection } from './AccountSection.tsx';
import { deviceWords } from './device-words.ts';

/** Where the member is signed in, with a way to end each. */
export function SessionList() {
  const { data: sessions } = useSuspenseQuery(sessionsQuery);
  const { moment } = useWords();
  const end = useEndSession();
  const used = (session: SessionRow) =>
    session.current ? 'This device, now' : `Last used ${moment(session.lastSeenAt)}`;
  return (
    <AccountSection title="Where you are signed in">
      <Refusal>{end.error?.message}</Refusal>
      <ul className="ruled mt-2">
        {sessions.map((session) => (
          <li key={session.id} className="flex items-center justify-between gap-4">
            <div>
              {deviceWords(session.device)}
              <p className="small mute">
                {used(session)} · {session.ip}
              </p>
            </div>
            {!session.current && (
              <button
                type="button"
                className="btn btn-quiet"
                disabled={end.isPending}
                onClick={() => end.mutate(session.id)}
              >
                End<span className="sr-only"> the session on {deviceWords(session.device)}</span>
              </button>
            )}
          </li>
        ))}
      </ul>
    </AccountSection>
  );
}
