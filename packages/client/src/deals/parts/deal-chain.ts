import type { DealView } from '@lydite/contracts';
import type { ChainStep } from '@lydite/ui';
import type { Words } from '../../market/use-words.ts';

/** The chain as the rail draws it: each step with its time, its actor and what it was. */
export const railSteps = (chain: DealView['chain'], { shortMoment }: Pick<Words, 'shortMoment'>): ChainStep[] =>
  chain.map(({ title, note, state, at, by }) => {
    const when = [at && shortMoment(at), by].filter(Boolean).join(', ');
    return { name: title, note: [when, note].filter(Boolean).join(' · '), state };
  });
