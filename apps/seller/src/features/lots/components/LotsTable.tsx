import { useWords } from '@lydite/client';
import type { MyLotRow } from '@lydite/contracts';
import { formatMassG, StreakInline } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { counted } from '../../../lib/counted.ts';
import { photoSrc } from '../../../lib/photo-src.ts';
import { standingOf } from '../lot-stage.ts';
import { StageLine, StageMark, stageHeads } from './StageMark.tsx';

/** Where a lot's next step is taken: its form, its deal, or its own page. */
export function lotAddress({ code, state, dealCode }: Pick<MyLotRow, 'code' | 'state' | 'dealCode'>): string {
  if (state === 'draft') return `/lots/${code}/contents`;
  return dealCode ? `/deals/${dealCode}` : `/lots/${code}`;
}

/** Own lots, one line each: what to do next, and how far along the chain each is. */
export function LotsTable({ lots }: { lots: readonly MyLotRow[] }) {
  return (
    <>
      <table className="table lots-table wide-only">
        <thead>
          <tr>
            <th scope="col">Lot</th>
            <th scope="col">Your next step</th>
            {stageHeads.map(({ stage, name }) => (
              <th key={stage} scope="col" className="stage-cell">
                {name}
              </th>
            ))}
            <th scope="col">Where it stands</th>
            <th scope="col">Gold, 8 results in 10</th>
          </tr>
        </thead>
        <tbody>
          {lots.map((lot) => (
            <WideRow key={lot.code} lot={lot} />
          ))}
        </tbody>
      </table>
      <ul className="ruled ruled-head phone-only mt-4">
        {lots.map((lot) => (
          <NarrowRow key={lot.code} lot={lot} />
        ))}
      </ul>
    </>
  );
}

function WideRow({ lot }: { lot: MyLotRow }) {
  const standing = standingOf(lot);
  return (
    <tr>
      <th scope="row">
        <LotCell lot={lot} />
      </th>
      <td className="max-w-52">
        <Duty lot={lot} />
      </td>
      {stageHeads.map(({ stage }) => (
        <td key={stage} className="stage-cell">
          <StageMark standing={standing} stage={stage} />
        </td>
      ))}
      <td className="max-w-56">
        <Stands lot={lot} />
      </td>
      <td>
        <Gold lot={lot} />
      </td>
    </tr>
  );
}

function NarrowRow({ lot }: { lot: MyLotRow }) {
  return (
    <li className="grid gap-2">
      <LotCell lot={lot} />
      <Duty lot={lot} />
      <div className="flex items-start gap-3 small">
        <StageLine standing={standingOf(lot)} />
        <div>
          <Stands lot={lot} />
        </div>
      </div>
      {lot.estimate && <Gold lot={lot} />}
    </li>
  );
}

function Gold({ lot: { estimate } }: { lot: MyLotRow }) {
  return estimate ? <StreakInline estimate={estimate} size="inline" /> : <span className="mute">Not listed yet</span>;
}

function LotCell({ lot }: { lot: MyLotRow }) {
  const { code, title, massG, coverPhotoId } = lot;
  return (
    <div className="lot-cell">
      {coverPhotoId ? (
        <img src={photoSrc(coverPhotoId, 'list')} alt="" loading="lazy" />
      ) : (
        <span className="no-photo" />
      )}
      <div>
        <Link to={lotAddress(lot)}>{title || 'Draft without a title'}</Link>
        <p>
          <span className="mono">{code}</span>
          {massG !== null && `, ${formatMassG(massG)}`}
        </p>
      </div>
    </div>
  );
}

function Duty({ lot: { duty, dutyBy } }: { lot: MyLotRow }) {
  const { moment, relative } = useWords();
  if (!duty) return <span className="mute wide-only">Nothing to do</span>;
  return (
    <div>
      <b>{duty}</b>
      {dutyBy && (
        <span className="block small mute">
          by {moment(dutyBy)}, {relative(dutyBy)}
        </span>
      )}
    </div>
  );
}

function Stands({ lot }: { lot: MyLotRow }) {
  const { money, moment } = useWords();
  const { stage, words, hasEnded } = standingOf(lot);
  const isOpen = stage === 'open' && !hasEnded;
  const bids = !hasEnded && lot.priceMinor !== null && money(lot.priceMinor);
  const details = [
    bids && (isOpen && lot.bidders > 0 ? `${bids}, ${counted(lot.bidders, 'bidder')}` : bids),
    isOpen && lot.bidders === 0 && 'no bids yet',
    isOpen && lot.closesAt && `closes ${moment(lot.closesAt)}`,
  ].filter(Boolean);
  return (
    <>
      {words}
      {details.length > 0 && <span className="block small mute">{details.join(', ')}</span>}
    </>
  );
}
