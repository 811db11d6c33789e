import type { DealAction, DealView } from '@lydite/contracts';
import { Button, buttonClass } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { addressOf, call } from '../../call/call.ts';
import { Refusal } from '../../form/Refusal.tsx';
import { announce } from '../../shell/announce.ts';
import { useDealStep } from '../deals.queries.ts';

/** Steps with a page of their own: where it is and what leads there. */
const pages: Partial<Record<DealAction, { path: string; label: string }>> = {
  pay: { path: 'pay', label: 'Check and pay' },
  dispatch: { path: 'dispatch', label: 'Enter the dispatch' },
  weigh_in: { path: 'weigh-in', label: 'Enter the weigh-in' },
  accept: { path: 'accept', label: 'Check and accept' },
  claim_mass: { path: 'claim', label: 'Claim the mass short' },
  countersign: { path: 'countersign', label: 'Check and countersign' },
  accept_claim: { path: 'accept-claim', label: 'Check and accept the claim' },
  cancel_late: { path: 'cancel', label: 'Cancel the deal' },
};

/** Steps that need no second look: one press. */
const presses = {
  receive: {
    label: 'Record the receipt',
    busy: 'Recording',
    done: 'The receipt is recorded.',
    note: 'From then on you have 3 days to weigh in. Do not process the lot until it is settled.',
    send: (dealCode: string) => call('POST /deals/:dealCode/receive', { params: { dealCode } }),
  },
  mark_ready: {
    label: 'Mark as ready for collection',
    busy: 'Marking',
    done: 'Marked as ready for collection.',
    note: 'The buyer is told at once and has 10 days to collect it. The risk passes at hand-over.',
    send: (dealCode: string) => call('POST /deals/:dealCode/ready', { params: { dealCode } }),
  },
} as const;

/** What this side can do now, the likeliest first; otherwise whose turn it is. */
export function NextStep({ deal }: { deal: DealView }) {
  const isProcessing = deal.payment.state === 'processing';
  const actions = deal.actions.filter((action) => !(action === 'pay' && isProcessing));
  const links = actions.flatMap((action) => pages[action] ?? []);
  const slip = deal.side === 'seller' && deal.state === 'held' && deal.delivery.way === 'seller-sends';
  return (
    <section aria-labelledby="next-title" className="sheet">
      <div className="sheet-body">
        <div>
          <h2 id="next-title">What happens next</h2>
          <NextWords deal={deal} />
        </div>
        {actions.includes('receive') && <Press code={deal.code} press={presses.receive} />}
        {actions.includes('mark_ready') && <Press code={deal.code} press={presses.mark_ready} />}
        {(links.length > 0 || slip) && (
          <p className="flex flex-wrap items-center gap-3">
            {links.map(({ path, label }, index) => (
              <Link
                key={path}
                to={`/deals/${deal.code}/${path}`}
                className={buttonClass(index === 0 && path !== 'cancel' ? 'primary' : 'plain')}
              >
                {label}
              </Link>
            ))}
            {slip && (
              <a
                className={buttonClass()}
                href={addressOf('GET /deals/:dealCode/packing-slip.pdf', { dealCode: deal.code })}
              >
                Packing slip
              </a>
            )}
          </p>
        )}
      </div>
    </section>
  );
}

/** What is due and what happens if it is not done; without a deadline, whose turn it is. */
function NextWords({ deal: { due, state, frozen, side } }: { deal: DealView }) {
  if (due && !frozen)
    return (
      <>
        <p className="mt-1">{due.what}.</p>
        {due.ifMissed && <p className="small mute mt-1">If that is missed: {lowerFirst(due.ifMissed)}</p>}
      </>
    );
  return <p className="mt-1">{frozen ? frozenWords : (undatedWords[state] ?? { [side]: deskWords })[side]}</p>;
}

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

const frozenWords = 'The market’s desk looks into it. Nothing has to be done until it is released.';
const deskWords = 'The market’s desk takes the next step. You are told when it has.';
const both = (words: string) => ({ buyer: words, seller: words });

const undatedWords: Partial<Record<DealView['state'], Record<DealView['side'], string>>> = {
  awaiting_payment: both('The bank processes the payment. The time to pay stands still until its word is here.'),
  held: {
    buyer: 'The seller is late. Wait, or cancel and have everything back.',
    seller: 'You are late: hand the lot over now. The buyer may cancel at any time.',
  },
  settling: both('The market works the settlement out. That takes a moment.'),
  settled: both('Nothing is left to do. The statement below shows how it was worked out.'),
  cancelled: both('The deal has ended. Nothing is left to do.'),
  refunded: both('The deal has ended. Nothing is left to do.'),
};

function Press({ code, press }: { code: string; press: (typeof presses)[keyof typeof presses] }) {
  const take = useDealStep<void>(async () => {
    const deal = await press.send(code);
    announce(press.done, { own: true });
    return deal;
  });
  return (
    <div className="grid justify-items-start gap-3">
      <p className="small mute">{press.note}</p>
      <Refusal>{take.error?.message}</Refusal>
      <Button look="primary" busy={take.isPending && press.busy} onClick={() => take.mutate()}>
        {press.label}
      </Button>
    </div>
  );
}
