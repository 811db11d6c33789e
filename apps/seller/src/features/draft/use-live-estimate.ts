import type { LotDraft } from '@lydite/contracts';
import { estimateLot, type Catalogue, type Estimate, type Warning } from '@lydite/valuation';
import { useEffect, useState } from 'react';
import { toLotInput, withNothingMeasured } from './lot-input.ts';
import { namedWarnings, narrowingOf, type Narrowing } from './narrowing.ts';

/** Long enough to let a figure be typed, short enough to see the streak answer. */
const afterMs = 250;
/** Any will do for a preview; listing takes the lot's own and more draws. */
const options = { seed: 1, draws: 4000 };

export interface LiveEstimate {
  estimate: Estimate | null;
  /** The estimate with nothing measured, when measuring has made a difference. */
  before: Estimate | null;
  narrowing: Narrowing[];
  warnings: Warning[];
}

/** What buyers would see of this draft, worked out in the browser as listing will work it out. */
export function liveEstimate(draft: LotDraft, catalogue: Catalogue): LiveEstimate {
  const input = toLotInput(draft, catalogue);
  if (input.lines.length === 0) return { estimate: null, before: null, narrowing: [], warnings: [] };
  const estimate = estimateLot(input, catalogue, options);
  const bare = withNothingMeasured(input);
  const isMeasured = JSON.stringify(Object.values(bare)) !== JSON.stringify(Object.values(input));
  const before = isMeasured ? estimateLot(bare, catalogue, options) : null;
  return {
    estimate: estimate.goldG.quantiles.p90 > 0 ? estimate : null,
    before: before && isWider(before, estimate) ? before : null,
    narrowing: narrowingOf(estimate.drivers, draft),
    warnings: namedWarnings(estimate, draft),
  };
}

const widthOf = ({ goldG: { quantiles } }: Estimate) => quantiles.p90 / quantiles.p10;
const isWider = (one: Estimate, other: Estimate) => widthOf(one) > widthOf(other) * 1.03;

/** The live estimate of what is being typed; it follows a moment after the last change. */
export function useLiveEstimate(draft: LotDraft, catalogue: Catalogue): LiveEstimate {
  const [live, setLive] = useState(() => liveEstimate(draft, catalogue));
  const [shown, setShown] = useState(draft.lines);
  useEffect(() => {
    if (shown === draft.lines) return;
    const timer = setTimeout(() => {
      setLive(liveEstimate(draft, catalogue));
      setShown(draft.lines);
    }, afterMs);
    return () => clearTimeout(timer);
  }, [draft, shown, catalogue]);
  return live;
}
