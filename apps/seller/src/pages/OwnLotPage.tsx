import { railSteps, Refusal, useMarket, useTitle, useWords } from '@lydite/client';
import type { LotView, MyLotView } from '@lydite/contracts';
import {
  Button,
  buttonClass,
  ChainRail,
  ChainSteps,
  FactList,
  formatMassG,
  Notice,
  Page,
  PageHead,
  Reading,
  Streak,
} from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, Navigate, useNavigate, useParams } from 'react-router-dom';
import { amountWords, platingWords } from '../features/lines/line-words.ts';
import { listingFacts } from '../features/listing/listing-words.ts';
import { listedLotQuery, myLotQuery, useCopyLot } from '../features/lots/lots.queries.ts';
import { standingOf } from '../features/lots/lot-stage.ts';
import { inHandMinor } from '../features/sale/what-is-left.ts';
import { counted } from '../lib/counted.ts';
import { photoSrc } from '../lib/photo-src.ts';

/** An own lot on the market: its streak as buyers see it, the bidding, and what the seller may still do. */
export function Component() {
  const { lotCode = '' } = useParams();
  const { data: own } = useSuspenseQuery(myLotQuery(lotCode));
  if (own.state === 'draft') return <Navigate to={`/lots/${lotCode}/photos`} replace />;
  if (own.listedAt === null) return <NotOpenYet own={own} />;
  return <Listed own={own} />;
}

function NotOpenYet({ own }: { own: MyLotView }) {
  useTitle(`${own.draft.title}, ${own.code}`);
  return (
    <Page shape="narrow">
      <h1>{own.draft.title}</h1>
      <p className="lead">{standingOf({ state: own.state, dealState: null }).words}.</p>
    </Page>
  );
}

function Listed({ own }: { own: MyLotView }) {
  const { data: lot } = useSuspenseQuery(listedLotQuery(own.code));
  const words = useWords();
  useTitle(`${lot.title}, ${lot.code}`);
  const steps = railSteps(lot.chain, words);
  return (
    <Page shape="rail">
      <ChainRail code={lot.code} steps={steps} />
      <div>
        <ChainSteps code={lot.code} steps={steps} />
        <Head own={own} lot={lot} />
        <div className="mt-9">
          <Streak
            subject={`lot ${lot.code}`}
            heading="How much gold this lot may hold"
            estimate={lot.estimate}
            pricePerGMinor={lot.price.perGramMinor}
            closed={lot.state !== 'open'}
            reader="other"
          />
        </div>
        <Bench own={own} lot={lot} />
        <div className="two">
          <div>
            <h2>As you listed it</h2>
            {lot.description && <p className="mt-2 whitespace-pre-line">{lot.description}</p>}
            <ul className="ruled mt-3">
              {lot.lines.map((line) => (
                <li key={line.id}>
                  <b>{line.label}</b>
                  <p className="small mute">
                    {[line.label === line.className ? null : line.className, amountWords(line), platingWords(line)]
                      .filter(Boolean)
                      .join(', ')}
                  </p>
                </li>
              ))}
            </ul>
            <FactList facts={listingFacts(own.draft, words.money)} />
          </div>
          <Photos lot={lot} />
        </div>
      </div>
    </Page>
  );
}

function Head({ own, lot }: { own: MyLotView; lot: LotView }) {
  const { moment, relative } = useWords();
  const isOpen = lot.state === 'open';
  return (
    <PageHead
      title={lot.title}
      facts={[
        <>
          <b>{formatMassG(lot.massG)}</b> net
        </>,
        counted(lot.lines.length, 'line'),
        <a key="public" href={`/lots/${lot.code}`}>
          See it as buyers do
        </a>,
      ]}
      end={
        isOpen ? (
          <>
            <b>Closes {moment(lot.closesAt)}</b>
            {relative(lot.closesAt)}
          </>
        ) : (
          <b>{standingOf({ state: own.state, dealState: null }).words}</b>
        )
      }
    />
  );
}

function Bench({ own, lot }: { own: MyLotView; lot: LotView }) {
  const { money } = useWords();
  const { sellerFeeBp } = useMarket();
  const { priceMinor, reserveReached } = own;
  const isAsking = lot.form === 'asking-price';
  return (
    <div className="bench">
      <Reading
        name={isAsking ? 'Asking price' : 'Highest bid'}
        value={priceMinor === null ? 'None yet' : money(priceMinor)}
      >
        {isAsking ? 'The first to take it has it' : counted(own.bidders, 'bidder')}
      </Reading>
      {reserveReached !== null && (
        <Reading name="Your lowest price" value={money(own.draft.sale.reserveMinor ?? 0)}>
          {reserveWords(reserveReached, own.state === 'open')}
        </Reading>
      )}
      {priceMinor !== null && (
        <Reading
          name="In hand at that price"
          value={money(inHandMinor(priceMinor, { sellerFeeBp, freightMinor: lot.delivery.freightMinor }))}
        >
          {lot.delivery.freightMinor > 0 ? 'With freight, after the market’s fee' : 'After the market’s fee'}
        </Reading>
      )}
      <Actions own={own} />
    </div>
  );
}

function reserveWords(isReached: boolean, isOpen: boolean): string {
  if (isReached) return isOpen ? 'It is reached' : 'It was reached';
  return isOpen ? 'It is not reached yet' : 'It was not reached';
}

function Actions({ own }: { own: MyLotView }) {
  const copy = useCopyLot(own.code);
  const navigate = useNavigate();
  const isOpen = own.state === 'open';
  return (
    <div className="bench-go">
      {own.dealCode && (
        <Link to={`/deals/${own.dealCode}`} className={buttonClass('primary')}>
          Go to the deal
        </Link>
      )}
      {isOpen && own.bidders === 0 && (
        <Link to={`/lots/${own.code}/withdraw`} className={buttonClass()}>
          Withdraw it
        </Link>
      )}
      <Button
        busy={copy.isPending && 'Copying'}
        onClick={() => copy.mutate(undefined, { onSuccess: ({ code }) => void navigate(`/lots/${code}/photos`) })}
      >
        Copy to a new draft
      </Button>
      <Refusal>{copy.error?.message}</Refusal>
      {isOpen && own.bidders > 0 && 'Bids are binding, so it can be withdrawn only by the desk.'}
    </div>
  );
}

function Photos({ lot }: { lot: LotView }) {
  if (lot.photos.length === 0) return <Notice>No photos.</Notice>;
  return (
    <div>
      <h2>Photos</h2>
      <div className="photos">
        {lot.photos.map(({ id, description, colour }) => (
          <figure key={id}>
            <img src={photoSrc(id, 'page')} alt={description} loading="lazy" style={{ backgroundColor: colour }} />
          </figure>
        ))}
      </div>
    </div>
  );
}
