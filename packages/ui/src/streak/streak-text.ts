import { NBSP } from '../text/characters.ts';
import { formatMoney } from '../text/format-money.ts';
import { formatBreakEvenG, formatGoldG, formatRange } from '../text/format-mass.ts';
import { formatNumber } from '../text/format-number.ts';
import { beadsAhead } from './beads.ts';
import type { AssayMark, StreakBid, StreakEstimate } from './streak-types.ts';

export interface StreakTextInput {
  estimate: StreakEstimate | null;
  /** The bid the reader stands behind, if any, in the money of `currency`. */
  bid?: Pick<StreakBid, 'amountMinor' | 'breakEvenG'> | null;
  currency?: string;
  assays?: readonly AssayMark[];
  /** Who reads it: a seller is told about the lot, never about a buyer's break-even. */
  reader?: 'buyer' | 'other';
}

/** A run of a sentence; `strong` runs are the figures one reads first. */
export interface TextRun {
  text: string;
  strong: boolean;
}

export interface StreakText {
  /** The sentence beside the chart, plain and as runs. */
  sentence: string;
  runs: TextRun[];
  /** The whole reading for those who can't see the chart: range, middle, break-even and count, assays. */
  description: string;
}

const plain = (text: string): TextRun => ({ text, strong: false });
const strong = (text: string): TextRun => ({ text, strong: true });

const labs: Record<AssayMark['by'], string> = {
  buyer: 'The buyer’s assay found',
  seller: 'The seller’s assay found',
  umpire: 'The umpire found',
  settled: 'It was settled on',
};

function assaySentence({ goldG, plusMinusG, by }: AssayMark, estimate: StreakEstimate): string {
  const { p10, p90 } = estimate.goldG.quantiles;
  const figure = `${formatNumber(goldG, { maximumFractionDigits: 2 })}${plusMinusG ? ` ± ${formatNumber(plusMinusG, { maximumFractionDigits: 2 })}` : ''}`;
  const where = goldG >= p10 && goldG <= p90 ? 'inside' : goldG < p10 ? 'below' : 'above';
  return `${labs[by]} ${figure}${NBSP}g, ${where} that range.`;
}

function sentenceRuns(estimate: StreakEstimate, { bid, reader = 'buyer' }: StreakTextInput): TextRun[] {
  const { p10, p50, p90 } = estimate.goldG.quantiles;
  const [least = '', most = ''] = formatRange([p10, p90], 'g', 'words').split(' to ');
  const ends = most ? [strong(least), plain(' and '), strong(most)] : [strong(least), plain(' and the same')];
  if (!bid || reader === 'other') {
    return [
      plain('Eight results in ten lie between '),
      ...ends,
      plain('; half lie above '),
      strong(formatGoldG(p50)),
      plain('.'),
    ];
  }
  const of = estimate.beadsG.length;
  return [
    strong(`${beadsAhead(estimate.beadsG, bid.breakEvenG)} of ${of}`),
    plain(' equally likely results hold more than the '),
    strong(formatBreakEvenG(bid.breakEvenG)),
    plain(' you need at this bid. Eight in ten lie between '),
    ...ends,
    plain('.'),
  ];
}

/** The estimate in words, always in natural frequencies. Counts are those of the drawn beads. */
export function streakText(input: StreakTextInput): StreakText {
  const { estimate, bid, currency = 'USD', assays = [], reader = 'buyer' } = input;
  if (!estimate) {
    const sentence = 'Not yet estimated.';
    return { sentence, runs: [plain(sentence)], description: sentence };
  }
  const runs = sentenceRuns(estimate, input);
  const { p10, p50, p90 } = estimate.goldG.quantiles;
  const parts = [`Eight results in ten lie between ${formatRange([p10, p90], 'g', 'words').replace(' to ', ' and ')}.`];
  parts.push(`Half lie above ${formatGoldG(p50)}.`);
  if (bid && reader === 'buyer') {
    const ahead = `${beadsAhead(estimate.beadsG, bid.breakEvenG)} of ${estimate.beadsG.length}`;
    parts.push(
      `At a bid of ${formatMoney(bid.amountMinor, currency)} you break even at ${formatBreakEvenG(bid.breakEvenG)}: ${ahead} equally likely results are above that.`,
    );
  }
  parts.push(...assays.map((assay) => assaySentence(assay, estimate)));
  return { sentence: runs.map(({ text }) => text).join(''), runs, description: parts.join(' ') };
}
