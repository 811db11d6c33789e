import { currencySign, formatMoney } from '../text/format-money.ts';
import { formatNumber } from '../text/format-number.ts';
import { NBSP } from '../text/characters.ts';
import { goldTicks, moneyTicks } from './streak-axis.ts';
import type { MoneyScale, StreakBid } from './streak-types.ts';

interface ScaleProps {
  axisMaxG: number;
  width: number;
  isWide: boolean;
}

/** Room a label needs, px: around the bid's flag, and at the left where the axis is named. */
const FLAG_CLEARANCE = { wide: 120, phone: 76 };
const NAME_CLEARANCE = { wide: 190, phone: 20 };

/** Room for one amount and the gap after it, px. */
const MONEY_LABEL_PX = 90;

interface MoneyScaleProps extends ScaleProps {
  money: MoneyScale;
  bid: StreakBid | null;
  flag: string;
}

const currencyNames: Record<string, string> = { USD: 'US$' };

/** The stone's upper edge: the bid that breaks even at each content. The drawing names the same figures, so it is hidden from speech. */
export function MoneyAxis({ axisMaxG, width, isWide, money, bid, flag }: MoneyScaleProps) {
  const share = (goldG: number) => goldG / axisMaxG;
  const flagShare = bid ? Math.min(Math.max(share(bid.breakEvenG), 0), 1) : null;
  const clear = FLAG_CLEARANCE[isWide ? 'wide' : 'phone'];
  const ticks = moneyTicks(axisMaxG, money, isWide ? Math.round(width / MONEY_LABEL_PX) : 4).filter(({ goldG }) => {
    const x = share(goldG) * width;
    const isByFlag = flagShare !== null && Math.abs(x - flagMiddle(flagShare, width)) < clear;
    return !isByFlag && x > NAME_CLEARANCE[isWide ? 'wide' : 'phone'] && x < width - 30;
  });
  const hidesName = flagShare !== null && flagShare * width < NAME_CLEARANCE.wide + 70;
  const name = currencyNames[money.currency] ?? money.currency;
  return (
    <div className="scale scale-top" aria-hidden="true">
      {isWide && !hidesName && <span className="axis-name">Bid that breaks even, {name}</span>}
      {ticks.map(({ amountMinor, goldG }) => (
        <span key={amountMinor} style={{ left: `${share(goldG) * 100}%` }}>
          {currencySign(money.currency)}
          {formatNumber(amountMinor / 100)}
        </span>
      ))}
      {bid && flagShare !== null && (
        <b className={flagClass(flagShare, width)} style={{ left: `${flagShare * 100}%` }}>
          {flag} <span className="num">{formatMoney(bid.amountMinor, money.currency)}</span>
        </b>
      )}
    </div>
  );
}

/** Half the width of the bid's flag, px. Nearer to an end than this and a little more, it stands to one side of its notch. */
const FLAG_HALF_PX = 45;
const FLAG_ROOM_PX = 70;

function flagClass(share: number, width: number): string {
  if (share * width < FLAG_ROOM_PX) return 'flag at-start';
  return share * width > width - FLAG_ROOM_PX ? 'flag at-end' : 'flag';
}

/** Where the middle of the flag's words comes to stand, px. */
function flagMiddle(share: number, width: number): number {
  const notch = share * width;
  if (notch < FLAG_ROOM_PX) return notch + FLAG_HALF_PX;
  return notch > width - FLAG_ROOM_PX ? notch - FLAG_HALF_PX : notch;
}

/** Ticks farther out than this share of the axis would meet its end, which is always named. */
const LAST_TICK = { wide: 0.94, phone: 0.86 };

/** The stone's lower edge: grams of gold. */
export function GoldAxis({ axisMaxG, isWide }: Omit<ScaleProps, 'width'>) {
  const ticks = goldTicks(axisMaxG, isWide ? 12 : 4).filter(
    (goldG) => goldG <= axisMaxG * LAST_TICK[isWide ? 'wide' : 'phone'],
  );
  return (
    <div className="scale" aria-hidden="true">
      {ticks.map((goldG) => (
        <span
          key={goldG}
          className={goldG === 0 ? 'at-start' : undefined}
          style={{ left: `${(goldG / axisMaxG) * 100}%` }}
        >
          {formatNumber(goldG)}
        </span>
      ))}
      <span className="at-end" style={{ left: '100%' }}>
        {formatNumber(axisMaxG)}
        {NBSP}g
      </span>
    </div>
  );
}

/** Width of the words before the ticks, px; ticks that would meet them go on a line of their own. */
const PAST_LABEL_PX = 290;

interface PastAssaysProps {
  axisMaxG: number;
  width: number;
  goldG: readonly number[];
}

/** Past assays of like lots, scaled to this lot's mass: the reference class beside the estimate. */
export function PastAssays({ axisMaxG, width, goldG }: PastAssaysProps) {
  const label = `${goldG.length} past ${goldG.length === 1 ? 'assay' : 'assays'} of like lots, at this mass`;
  const shown = goldG.filter((one) => one <= axisMaxG);
  const isUnderLabel = Math.min(...shown, axisMaxG) * (width / axisMaxG) < PAST_LABEL_PX;
  return (
    <div className={isUnderLabel ? 'past-assays past-assays-apart' : 'past-assays'}>
      <span>{label}</span>
      {shown.map((one, i) => (
        <i key={i} aria-hidden="true" style={{ left: `${(one / axisMaxG) * 100}%` }} />
      ))}
    </div>
  );
}
