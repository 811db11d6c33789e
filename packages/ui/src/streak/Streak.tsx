import { useId, useState, type ReactNode } from 'react';
import { Segmented } from '../button/Segmented.tsx';
import { AssayLabels } from './AssayLabels.tsx';
import { beadsAhead } from './beads.ts';
import { NotchHandle } from './NotchHandle.tsx';
import { streakAxisMaxG } from './streak-axis.ts';
import { streakText, type TextRun } from './streak-text.ts';
import type { AssayMark, MoneyScale, StreakBid, StreakEstimate } from './streak-types.ts';
import { GoldAxis, MoneyAxis, PastAssays } from './StreakScales.tsx';
import { StreakStone } from './StreakStone.tsx';
import { StreakTable } from './StreakTable.tsx';
import { useWidth } from './use-width.ts';

/** Narrower stones are drawn in the phone's geometry. */
const LEAST_WIDE_PX = 600;
/** Left part of the stone the legend takes when nothing is drawn there. */
const LEGEND_PX = 215;

export interface StreakProps {
  /** What is estimated, for the accessible name: "lot L-2481". */
  subject: string;
  heading?: ReactNode;
  estimate: StreakEstimate | null;
  before?: StreakEstimate | null;
  axisMaxG?: number | null;
  /** Draws the money axis along the upper edge. */
  money?: MoneyScale | null;
  bid?: StreakBid | null;
  /** Words before the bid's amount, "Your bid" unless said otherwise ("Sold at"). */
  bidLabel?: string;
  /** Gold at which the highest bid of another buyer breaks even. */
  leadBreakEvenG?: number | null;
  closed?: boolean;
  assays?: readonly AssayMark[];
  assayNames?: Record<AssayMark['by'], string>;
  assayLimitG?: number | null;
  /** Past assays of like lots scaled to this lot's mass, grams. */
  pastG?: readonly number[];
  pricePerGMinor?: number | null;
  reader?: 'buyer' | 'other';
  /** Makes the notch movable; amounts in minor units. */
  move?: { stepMinor: number; leastMinor: number; mostMinor: number; onMove: (amountMinor: number) => void };
  /** Replaces the sentence under the stone. */
  children?: ReactNode;
}

const plainNames: Record<AssayMark['by'], string> = {
  buyer: 'Buyer’s',
  seller: 'Seller’s',
  umpire: 'Umpire',
  settled: 'Settled',
};

/** A sentence of runs, its leading figures in bold. */
export function Runs({ runs }: { runs: readonly TextRun[] }) {
  return runs.map((run, i) => (run.strong ? <b key={i}>{run.text}</b> : run.text));
}

function Legend({ hasBid, of }: { hasBid: boolean; of: number }) {
  return (
    <p className="streak-key">
      Each bead: 1 result in {of}, all equally likely.{hasBid && ' Filled: you come out ahead.'}
    </p>
  );
}

/** A lot's estimate on the touchstone with both scales, the sentence in natural frequencies and the same figures as a table. */
export function Streak(props: StreakProps) {
  const {
    subject,
    heading,
    estimate,
    money = null,
    bid = null,
    assays = [],
    reader = 'buyer',
    move,
    pricePerGMinor,
  } = props;
  const id = useId();
  const [view, setView] = useState<'streak' | 'table'>('streak');
  const [ref, width] = useWidth<HTMLDivElement>(1140);
  const currency = money?.currency ?? 'USD';
  const text = streakText({ estimate, bid, currency, assays, reader });
  const switcher = estimate && (
    <Segmented
      label="Show as"
      value={view}
      options={[
        { value: 'streak', label: 'Streak' },
        { value: 'table', label: 'Table' },
      ]}
      onChange={setView}
    />
  );
  return (
    <section className="streak" aria-labelledby={heading ? `${id}-h` : undefined}>
      <div className="streak-head">
        {heading && <h2 id={`${id}-h`}>{heading}</h2>}
        {switcher}
      </div>
      <div ref={ref}>
        {view === 'table' && estimate ? (
          <StreakTable
            estimate={estimate}
            currency={currency}
            pricePerGMinor={pricePerGMinor}
            bid={reader === 'buyer' ? bid : null}
          />
        ) : (
          <Stone
            {...props}
            id={id}
            width={width}
            title={`Estimated fine gold in ${subject}`}
            description={text.description}
            move={move}
          />
        )}
      </div>
      <p className="say">{props.children ?? <Runs runs={text.runs} />}</p>
    </section>
  );
}

interface StoneProps extends StreakProps {
  id: string;
  width: number;
  title: string;
  description: string;
}

function Stone({ id, width, title, description, ...props }: StoneProps) {
  const { estimate, before, money, bid = null, leadBreakEvenG, closed, assays = [], pastG = [], move } = props;
  const isWide = width >= LEAST_WIDE_PX;
  const axisMaxG =
    props.axisMaxG ?? Math.max(estimate ? streakAxisMaxG(estimate) : 100, before ? streakAxisMaxG(before) : 0);
  const of = estimate?.beadsG.length ?? 0;
  const hasBid = bid !== null && props.reader !== 'other';
  const showsInside =
    isWide &&
    estimate !== null &&
    (estimate.goldG.quantiles.p0_15 / axisMaxG) * width > LEGEND_PX &&
    assays.length === 0;
  return (
    <>
      {estimate && !showsInside && assays.length === 0 && <Legend hasBid={hasBid} of={of} />}
      {money && estimate && (
        <MoneyAxis
          axisMaxG={axisMaxG}
          width={width}
          isWide={isWide}
          money={money}
          bid={bid}
          flag={props.bidLabel ?? 'Your bid'}
        />
      )}
      <div className="streak-stone">
        <StreakStone
          id={id}
          size={isWide ? 'large' : 'phone'}
          width={width}
          legend={showsInside ? (hasBid ? 'bid' : 'beads') : 'none'}
          {...{ estimate, before, axisMaxG, closed, assays, title, description }}
          breakEvenG={bid?.breakEvenG}
          leadBreakEvenG={leadBreakEvenG}
        />
        {move && money && bid && estimate && (
          <NotchHandle
            {...move}
            bid={bid}
            money={money}
            axisMaxG={axisMaxG}
            ahead={`${beadsAhead(estimate.beadsG, bid.breakEvenG)} of ${of}`}
          />
        )}
      </div>
      {estimate && <GoldAxis axisMaxG={axisMaxG} isWide={isWide} />}
      {assays.length > 0 && (
        <AssayLabels
          axisMaxG={axisMaxG}
          assays={assays}
          names={props.assayNames ?? plainNames}
          limitG={props.assayLimitG ?? null}
        />
      )}
      {pastG.length > 0 && <PastAssays axisMaxG={axisMaxG} width={width} goldG={pastG} />}
    </>
  );
}
