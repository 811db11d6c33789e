import { catalogueQuery, useMarket, useMember } from '@lydite/client';
import { buttonClass, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link, Navigate, Outlet, useLocation, useOutletContext, useParams } from 'react-router-dom';
import { BuyersView, BuyersViewLine } from '../../features/draft/components/BuyersView.tsx';
import { DraftSteps } from '../../features/draft/components/DraftSteps.tsx';
import { SaveTrouble } from '../../features/draft/components/SaveTrouble.tsx';
import { DraftProvider, useDraft } from '../../features/draft/draft-context.tsx';
import { openedDraftQuery } from '../../features/draft/draft.queries.ts';
import { stepAfter, stepIds, stepNotes, type StepId } from '../../features/draft/steps.ts';
import { useLiveEstimate, type LiveEstimate } from '../../features/draft/use-live-estimate.ts';
import { useAcceptedChecks, type AcceptedChecks } from '../../features/lines/accepted-checks.ts';
import { PhotoQueueProvider, usePhotoSending } from '../../features/photos/photo-queue-context.tsx';
import { usePhotoOrder } from '../../features/photos/use-photo-order.ts';

/** What the five pages of a new lot share: the draft, its streak, the photos on their way. */
export function Component() {
  const { lotCode = '' } = useParams();
  const member = useMember();
  return member ? <OpenedDraft key={lotCode} memberId={member.id} lotCode={lotCode} /> : null;
}

function OpenedDraft({ memberId, lotCode }: { memberId: string; lotCode: string }) {
  const { data } = useSuspenseQuery(openedDraftQuery(memberId, lotCode));
  if (data.lot.state !== 'draft') return <Navigate to={`/lots/${lotCode}`} replace />;
  return (
    <DraftProvider memberId={memberId} {...data}>
      <Photographs memberId={memberId}>
        <DraftForm />
      </Photographs>
    </DraftProvider>
  );
}

function Photographs({ memberId, children }: { memberId: string; children: ReactNode }) {
  const { lot, setPhotos, refresh } = useDraft();
  const { place } = usePhotoOrder({ lotCode: lot.code, photos: lot.photos, onPhotos: setPhotos, refresh });
  return (
    <PhotoQueueProvider memberId={memberId} lotCode={lot.code} onSent={place}>
      {children}
    </PhotoQueueProvider>
  );
}

interface DraftOutlet {
  live: LiveEstimate;
  checks: AcceptedChecks;
}

/** The streak and the checks of the draft, for the page in the middle. */
export const useDraftOutlet = (): DraftOutlet => useOutletContext<DraftOutlet>();

function DraftForm() {
  const { lot, draft, state, flush } = useDraft();
  const { currency } = useMarket();
  const { data: catalogue } = useSuspenseQuery(catalogueQuery());
  const { photos: waiting } = usePhotoSending();
  const live = useLiveEstimate(draft, catalogue);
  const checks = useAcceptedChecks(lot.code);
  const current = useCurrentStep();
  const checkCount = live.warnings.filter(({ code, lineId }) => {
    const line = draft.lines.find(({ id }) => id === lineId);
    return code === 'mass-per-piece' && line && !checks.isAccepted(line);
  }).length;
  const notes = stepNotes({
    draft,
    missing: lot.missing,
    photoCount: lot.photos.length,
    waitingCount: waiting.length,
    checkCount,
    currency,
  });
  if (state === 'listed') return <Navigate to={`/lots/${lot.code}`} replace />;
  return (
    <Page shape="form">
      <DraftSteps code={lot.code} current={current} notes={notes} />
      {/* Leaving any field saves: what was typed is safe before the next page is asked for. */}
      <div onBlur={() => void flush()}>
        <SaveTrouble currency={currency} />
        <Outlet context={{ live, checks } satisfies DraftOutlet} />
        <Onward code={lot.code} current={current} checkCount={checkCount} />
      </div>
      <aside className="page-aside">
        <BuyersView {...live} />
      </aside>
      {current !== 'check' && (
        <div className="page-foot">
          <BuyersViewLine estimate={live.estimate} />
          <OnwardLink code={lot.code} current={current} className="btn-wide" />
        </div>
      )}
    </Page>
  );
}

function useCurrentStep(): StepId {
  const { pathname } = useLocation();
  return stepIds.find((id) => pathname.endsWith(`/${id}`)) ?? 'photos';
}

function OnwardLink({ code, current, className = '' }: { code: string; current: StepId; className?: string }) {
  const next = stepAfter(current);
  return (
    next && (
      <Link to={`/lots/${code}/${next.id}`} className={`${buttonClass('primary')} ${className}`}>
        {next.label}
      </Link>
    )
  );
}

function Onward({ code, current, checkCount }: { code: string; current: StepId; checkCount: number }) {
  if (current === 'check') return null;
  const isHere = current === 'contents' && checkCount > 0;
  return (
    <div className="actions wide-only">
      <OnwardLink code={code} current={current} />
      {isHere && (
        <span className="small mute">
          {checkCount === 1 ? 'One figure to check above.' : `${checkCount} figures to check above.`} It will not stop
          you.
        </span>
      )}
    </div>
  );
}
