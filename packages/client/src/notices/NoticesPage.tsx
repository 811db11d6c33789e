import type { NoticeView } from '@lydite/contracts';
import { EmptyState, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useNow } from '../market/use-now.ts';
import { useWords } from '../market/use-words.ts';
import { OriginLink } from '../shell/OriginLink.tsx';
import { useTitle } from '../shell/use-title.ts';
import { noticesQuery, useMarkRead } from './notices.queries.ts';

/** Counts all as read, also those that arrive while the page is open. */
function useReadAll(notices: NoticeView[]): void {
  const { mutate } = useMarkRead();
  const newest = notices.find(({ readAt }) => readAt === null)?.id;
  useEffect(() => {
    if (newest !== undefined) mutate();
  }, [newest, mutate]);
}

export function Component() {
  const { data: notices } = useSuspenseQuery(noticesQuery);
  const { moment, relative } = useWords();
  const now = useNow();
  const [openedAt] = useState(now);
  // What was new when the page was opened stays marked until it is left, though it counts as read from then on.
  const isNew = ({ readAt }: NoticeView) => readAt === null || new Date(readAt) >= openedAt;
  useReadAll(notices);
  useTitle('Notices');
  return (
    <Page shape="narrow">
      <h1>Notices</h1>
      <p className="lead">Each also went to your mailbox. Money, deadlines and disputes are always told.</p>
      {notices.length === 0 ? (
        <div className="mt-6">
          <EmptyState title="Nothing yet">
            When you are outbid, win a lot, have to pay, send or weigh in, it will stand here.
          </EmptyState>
        </div>
      ) : (
        <ul className="ruled ruled-head mt-6">
          {notices.map((notice) => (
            <li key={notice.id}>
              <p className="flex flex-wrap items-baseline justify-between gap-x-6">
                <OriginLink to={notice.link}>
                  <span className={isNew(notice) ? 'font-semibold' : undefined}>{notice.subject}</span>
                </OriginLink>
                <span className="tiny mute-3">
                  {isNew(notice) && <b className="text-ink">New · </b>}
                  <time dateTime={notice.createdAt} title={moment(notice.createdAt)}>
                    {relative(notice.createdAt)}
                  </time>
                </span>
              </p>
              <p className="small mute mt-1 whitespace-pre-line">{notice.text}</p>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}
