import type { DeskDeal } from '@lydite/contracts';

/** The desk's words for a state: `awaiting_payment` is "awaiting payment". */
export const stateWords = ({ state, frozen }: Pick<DeskDeal, 'state' | 'frozen'>): string =>
  `${state.replaceAll('_', ' ')}${frozen ? ', frozen' : ''}`;

const endedStates = new Set(['settled', 'cancelled', 'refunded']);
export const isEnded = ({ state }: Pick<DeskDeal, 'state'>): boolean => endedStates.has(state);

/** Whose word a deal waits for when no clock runs. */
export function waitWords(deal: DeskDeal): string {
  if (isEnded(deal)) return 'Ended. Nothing is left to do.';
  if (deal.frozen) return 'Frozen: the deadlines stand still until the bank has decided.';
  if (deal.state === 'settling') return 'The market works the settlement out.';
  if (deal.state === 'awaiting_payment') return 'The bank processes the payment; the time to pay stands still.';
  return 'No deadline runs: it waits for the desk.';
}
