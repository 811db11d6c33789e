/** A value that somebody published, and what the valuation makes of the same question. */
export interface PublishedValue {
  what: string;
  /** As printed: its decimals say how closely it must be met. */
  published: string;
  unit: string;
  source: string;
  ours: () => number;
  /** Largest difference, where the last printed digit does not say it; the source line says why. */
  within?: number;
}

/** A published figure that must lie inside what the model holds possible. */
export interface PublishedInside {
  what: string;
  published: number;
  unit: string;
  source: string;
  range: () => [low: number, high: number];
}

/** Half a unit of the last printed digit, with a trace for the binary form of the printed number. */
export function toleranceOf({ published, within }: Pick<PublishedValue, 'published' | 'within'>): number {
  if (within !== undefined) return within;
  const decimals = /\.(\d+)/.exec(published)?.[1]?.length ?? 0;
  return 0.5 * 10 ** -decimals * (1 + 1e-9);
}

/** A value from an independent library, to twelve digits. */
export function fromLibrary(value: number): Pick<PublishedValue, 'published' | 'within'> {
  return { published: `${value}`, within: Math.abs(value) * 1e-12 };
}
