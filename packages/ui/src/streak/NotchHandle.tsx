import type { KeyboardEvent, PointerEvent } from 'react';
import { LOCALE } from '../text/format-number.ts';
import { bidAt } from './streak-axis.ts';
import type { MoneyScale, StreakBid } from './streak-types.ts';

interface NotchHandleProps {
  bid: StreakBid;
  money: MoneyScale;
  axisMaxG: number;
  ahead: string;
  /** One bid step, minor units. */
  stepMinor: number;
  leastMinor: number;
  mostMinor: number;
  onMove: (amountMinor: number) => void;
}

const keySteps: Record<string, number> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
};

function spokenMoney(amountMinor: number, currency: string): string {
  const digits = amountMinor % 100 === 0 ? 0 : 2;
  const options = {
    style: 'currency',
    currency,
    currencyDisplay: 'name',
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  } as const;
  return new Intl.NumberFormat(LOCALE, options).format(amountMinor / 100);
}

/** Moves the own bid along the upper edge by arrow keys or by dragging. Typing in the bid's field does the same. */
export function NotchHandle({
  bid,
  money,
  axisMaxG,
  ahead,
  stepMinor,
  leastMinor,
  mostMinor,
  onMove,
}: NotchHandleProps) {
  const moveTo = (amountMinor: number) => {
    const stepped = Math.round(amountMinor / stepMinor) * stepMinor;
    onMove(Math.min(Math.max(stepped, leastMinor), mostMinor));
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const steps = keySteps[event.key];
    if (steps !== undefined) moveTo(bid.amountMinor + steps * stepMinor);
    else if (event.key === 'Home') moveTo(leastMinor);
    else if (event.key === 'End') moveTo(mostMinor);
    else return;
    event.preventDefault();
  };
  const onPointerMove = (event: PointerEvent<HTMLElement>) => {
    if (!event.currentTarget.hasPointerCapture(event.pointerId)) return;
    const stone = event.currentTarget.parentElement?.getBoundingClientRect();
    if (stone && stone.width > 0) moveTo(bidAt(((event.clientX - stone.left) / stone.width) * axisMaxG, money));
  };
  return (
    <span
      className="notch-handle"
      role="slider"
      tabIndex={0}
      aria-label="Your bid"
      aria-valuemin={leastMinor / 100}
      aria-valuemax={mostMinor / 100}
      aria-valuenow={bid.amountMinor / 100}
      aria-valuetext={`${spokenMoney(bid.amountMinor, money.currency)}, ahead in ${ahead}`}
      style={{ left: `${Math.min(Math.max(bid.breakEvenG / axisMaxG, 0), 1) * 100}%` }}
      onKeyDown={onKeyDown}
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={onPointerMove}
    />
  );
}
