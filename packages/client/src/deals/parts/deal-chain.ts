import type { DealView } from '@lydite/contracts';
import type { ChainStep } from '@lydite/ui';
import type { Words } from '../../market/use-words.ts';

/** What a step is called before it has happened; afterwards the market's own word stands. */
const ahead: Record<string, string> = {
  hold: 'Payment into hold',
  dispatch: 'Hand-over',
  receipt: 'Receipt',
  weigh_in: 'Weigh-in',
  settlement: 'Settlement',
  payout: 'Release of the hold',
};

/** The chain as the rail draws it: each step with its time, its actor and what it was. */
export const railSteps = (chain: DealView['chain'], { shortMoment }: Pick<Words, 'shortMoment'>): ChainStep[] =>
  chain.map(({ key, title, note, state, at, by }) => {
    const when = [at && shortMoment(at), by].filter(Boolean).join(', ');
    return {
      name: state === 'done' ? title : (ahead[key] ?? title),
      note: [when, note].filter(Boolean).join(' · '),
      state,
    };
  });
