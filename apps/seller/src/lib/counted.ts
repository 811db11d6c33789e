import { formatNumber } from '@lydite/ui';

/** A count with its noun: "1 line", "3 lines". */
export const counted = (count: number, noun: string, many = `${noun}s`): string =>
  `${formatNumber(count)} ${count === 1 ? noun : many}`;
