import type { Estimate, Quantiles } from '@lydite/valuation';

/** The part of a stored estimate the streak is drawn from. A whole `Estimate` fits. */
export type StreakEstimate = Pick<Estimate, 'massG' | 'beadsG' | 'density'> & { goldG: { quantiles: Quantiles } };

/** What a list sends of each estimate: enough for the smear, without beads. */
export type StreakOutline = Pick<Estimate, 'massG' | 'density'> & { goldG: Quantiles };

/** The outline of either form. */
export function outlineOf(estimate: StreakEstimate | StreakOutline): StreakOutline {
  const { massG, goldG, density } = estimate;
  return { massG, density, goldG: 'quantiles' in goldG ? goldG.quantiles : goldG };
}

export type StreakSize = 'large' | 'phone' | 'medium' | 'card' | 'row' | 'cell' | 'inline';

/** `screen` names CSS variables, `mail` writes the stone's own colours, `print` is black on white. */
export type StreakTheme = 'screen' | 'mail' | 'print';

/** A laboratory's result; `settled` is the figure paid on and has no head. */
export interface AssayMark {
  goldG: number;
  /** Two standard deviations in grams, or null when the certificate gives none. */
  plusMinusG: number | null;
  by: 'buyer' | 'seller' | 'umpire' | 'settled';
}

export interface StreakInput {
  /** Prefix of the ids inside the SVG: unique on its page. */
  id: string;
  size: StreakSize;
  theme: StreakTheme;
  /** Null draws the bare stone: "Not yet estimated". */
  estimate: StreakEstimate | StreakOutline | null;
  /** The estimate this one replaced: dashed brackets at its p10 and p90. */
  before?: StreakEstimate | StreakOutline | null;
  /** Gold in grams at which the own (or the winning) bid breaks even: the notch. */
  breakEvenG?: number | null;
  /** Gold in grams at which another buyer's highest bid breaks even: the open chevron. */
  leadBreakEvenG?: number | null;
  /** After the close the notch stays and its line goes. */
  closed?: boolean;
  assays?: readonly AssayMark[];
  /** End of the axis in grams; fixed once bidding opens. Left out, it follows the estimate. */
  axisMaxG?: number | null;
  /** Width in px where a page has measured it; left out, the size's own. */
  width?: number;
  /** Explains the beads on the stone's bare left side; only the large size has room for it. */
  legend?: 'none' | 'beads' | 'bid';
  /** Accessible name and description; left out, the drawing is hidden from assistive technology. */
  title?: string;
  description?: string;
}

/** How a bid and the gold it needs go together: the bid that breaks even at `g` grams is `atZeroMinor + perGMinor · g`. */
export interface MoneyScale {
  currency: string;
  /** Minor units; negative when costs eat the first grams. */
  atZeroMinor: number;
  /** Minor units per gram, above 0. */
  perGMinor: number;
}

export interface StreakBid {
  amountMinor: number;
  breakEvenG: number;
  /** What each gram above break-even leaves the bidder, minor units per gram. */
  resultPerGMinor: number;
}
