import type { DealView } from '@lydite/contracts';
import { FactList, formatMassG, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { addressOf } from '../../call/call.ts';
import { useMember } from '../../session/session.queries.ts';
import { useWords } from '../../market/use-words.ts';
import { useTitle } from '../../shell/use-title.ts';
import { dealQuery } from '../deals.queries.ts';
import { MoneyTable } from '../parts/MoneyTable.tsx';

/** The arithmetic of a settlement, for the screen and for paper. */
export function Component() {
  const { dealCode = '' } = useParams();
  const { data: deal } = useSuspenseQuery(dealQuery(dealCode));
  useTitle(`Settlement statement ${deal.code}`);
  return (
    <Page shape="narrow">
      <p className="small print:hidden">
        <Link to={`/deals/${deal.code}`}>Deal {deal.code}</Link>
      </p>
      <h1 className="mt-2">Settlement statement</h1>
      {deal.settlement ? (
        <Statement deal={deal} settlement={deal.settlement} />
      ) : (
        <p className="say mt-4">This deal is not settled yet. The statement will stand here on the day it is.</p>
      )}
    </Page>
  );
}

function Statement({ deal, settlement }: { deal: DealView; settlement: NonNullable<DealView['settlement']> }) {
  const { moment } = useWords();
  const member = useMember();
  const own = member ? `${member.name}, ${member.place}` : '';
  const other = deal.counterparty ? `${deal.counterparty.name}, ${deal.counterparty.place}` : '';
  const [seller, buyer] = deal.side === 'seller' ? [own, other] : [other, own];
  return (
    <>
      <div className="mt-5">
        <FactList
          facts={[
            { name: 'Deal', value: <span className="mono">{deal.code}</span> },
            {
              name: 'Lot',
              value: (
                <>
                  <span className="mono">{deal.lotCode}</span>, {deal.title}
                </>
              ),
            },
            { name: 'Seller', value: seller },
            { name: 'Buyer', value: buyer },
            { name: 'Settled', value: moment(settlement.settledAt) },
            ...massFacts(deal),
          ]}
        />
      </div>
      <section aria-labelledby="to-seller" className="mt-8">
        <h2 id="to-seller">To the seller</h2>
        <MoneyTable caption="To the seller" rows={settlement.sellerSteps} />
      </section>
      <section aria-labelledby="from-hold" className="mt-8">
        <h2 id="from-hold">From the hold</h2>
        <MoneyTable caption="From the hold" rows={settlement.buyerSteps} />
      </section>
      <p className="tiny mute mt-6 break-all">
        Record <span className="mono">{settlement.hash}</span>
      </p>
      <p className="tiny mute mt-1">
        Gold only: other metals go to the buyer and are in the price. The figures add up by hand, each rounded to the
        cent.
      </p>
      <p className="actions print:hidden">
        <a className="btn" href={addressOf('GET /deals/:dealCode/statement.pdf', { dealCode: deal.code })}>
          Statement as PDF
        </a>
        <button type="button" className="btn" onClick={() => window.print()}>
          Print
        </button>
      </p>
    </>
  );
}

const massFacts = ({ weighIn }: DealView) =>
  weighIn
    ? [
        { name: 'Declared', value: formatMassG(weighIn.declaredG) },
        {
          name: 'Weighed in',
          value: `${formatMassG(weighIn.netG)} net (${formatMassG(weighIn.grossG)} gross, ${formatMassG(weighIn.tareG)} tare), tolerance ${formatMassG(weighIn.toleranceG)}`,
        },
      ]
    : [];
