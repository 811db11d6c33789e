import type { StoredEstimate } from '@lydite/contracts';

type Driver = StoredEstimate['drivers'][number];
export type Measurement = Pick<Driver, 'question' | 'share' | 'nowG' | 'afterG'>;

const most = 3;
/** A smaller share would hardly show in the range. */
const leastShare = 0.03;

/** What would narrow an estimate, largest first. Several figures that one measurement answers are one. */
export function worthwhileMeasurements(drivers: readonly Driver[]): Measurement[] {
  const byQuestion = new Map<string, Measurement>();
  for (const { question, share, nowG, afterG } of drivers) {
    const before = byQuestion.get(question);
    byQuestion.set(question, { question, nowG, afterG, share: share + (before?.share ?? 0) });
  }
  return [...byQuestion.values()]
    .filter(({ share }) => share >= leastShare)
    .toSorted((a, b) => b.share - a.share)
    .slice(0, most);
}
