import type { DeskDeal } from '@lydite/contracts';
import { Button, Notice } from '@lydite/ui';
import { useApproveSettlement } from './deals.queries.ts';

/** The one thing an operator does with a deal so far: a settlement above the limit waits for it. */
export function ApproveStrip({ deal }: { deal: DeskDeal }) {
  const approve = useApproveSettlement(deal.code);
  if (deal.state !== 'needs_approval') return null;
  return (
    <section aria-labelledby="approve-title" className="mt-5">
      <h3 id="approve-title">Settlement to approve</h3>
      <p className="mt-1">
        It is above the amount up to which settlements run by themselves. Approving pays the seller and sends back what
        is left of the hold; neither can be taken back here.
      </p>
      {approve.error && (
        <div className="mt-3">
          <Notice tone="warn">{approve.error.message}</Notice>
        </div>
      )}
      <p className="actions">
        <Button look="primary" busy={approve.isPending && 'Approving'} onClick={() => approve.mutate()}>
          Approve the settlement
        </Button>
      </p>
    </section>
  );
}
