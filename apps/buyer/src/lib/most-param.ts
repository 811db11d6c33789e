import { parseMoneyMinor } from '@lydite/ui';

/** The amount a buyer is trying out, as addresses carry it: `?most=6200` or `?most=6200.5`, in whole units of the currency. */
export const mostParam = (amountMinor: number): string => `most=${amountMinor / 100}`;

/** The amount of an address in minor units; null when there is none that can be read. */
export const readMost = (search: URLSearchParams): number | null => parseMoneyMinor(search.get('most') ?? '', 'en');
