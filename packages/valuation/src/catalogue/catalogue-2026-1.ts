import { boardClasses } from './2026-1/boards.ts';
import { chipClasses } from './2026-1/chips.ts';
import { edgeClasses } from './2026-1/edge.ts';
import { pinClasses } from './2026-1/pins.ts';
import { processorClasses } from './2026-1/processors.ts';
import type { Catalogue } from './catalogue.types.ts';

/** The first catalogue, as seeded into the database. A published version never changes; corrections make a new one. */
export const catalogue20261: Catalogue = {
  version: '2026.1',
  classes: [...edgeClasses, ...boardClasses, ...processorClasses, ...chipClasses, ...pinClasses],
};
