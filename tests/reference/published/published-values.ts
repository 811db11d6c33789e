import { goldInside, goldValues } from './gold.values.ts';
import { marketValues } from './market.values.ts';
import type { PublishedInside, PublishedValue } from './published-value.ts';
import { statisticsValues } from './statistics.values.ts';
import { unitValues } from './units.values.ts';

/** Every published value the valuation is held against; `npm run reference` prints them. */
export const publishedValues: PublishedValue[] = [...unitValues, ...goldValues, ...statisticsValues, ...marketValues];

export const publishedInside: PublishedInside[] = goldInside;
