export * from './streak/index.ts';
export * from './text/index.ts';
export { Segmented } from './button/Segmented.tsx';
export { ChainRail, ChainSteps } from './chain/ChainRail.tsx';
export type { ChainStep } from './chain/chain-types.ts';
