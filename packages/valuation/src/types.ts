/**
 * A number with its spread.
 * - `uniform`, `triangular`: hard limits; `normal`: truncated at 0; `lognormal`: by its median and geometric standard deviation (≥ 1).
 */
export type Quantity =
  | { kind: 'exact'; value: number }
  | { kind: 'uniform'; lo: number; hi: number }
  | { kind: 'triangular'; lo: number; mode: number; hi: number }
  | { kind: 'normal'; mean: number; sd: number }
  | { kind: 'lognormal'; median: number; gsd: number };

export type IdentityEvidence = 'stated' | 'photographed' | 'inspected';
export type MassEvidence = 'stated' | 'weighed';
export type CountEvidence = 'stated' | 'counted-on-photo' | 'counted';

/** How the plating's thickness is known: by a standard's class, as a range the seller gives, or by an XRF reading. Micrometres. */
export type PlatingEvidence =
  | { kind: 'standard'; minimumUm: number }
  | { kind: 'range'; leastUm: number; mostUm: number }
  | { kind: 'xrf'; thicknessUm: number };

/** One material class within a lot, as described by the seller. At least one of `massG` and `pieces` is given. */
export interface LineInput {
  id: string;
  classCode: string;
  identityEvidence: IdentityEvidence;
  /** Net mass in grams, or null when only pieces are known. */
  massG: number | null;
  massEvidence: MassEvidence;
  /** The scale's resolution in grams; used when weighed. */
  scaleResolutionG: number | null;
  pieces: number | null;
  countEvidence: CountEvidence;
  plating: PlatingEvidence | null;
  /** Figures that replace the class's own; null where the class's guess stands. */
  contactsPerPiece: number | null;
  padAreaMm2: number | null;
  areaCm2PerPiece: number | null;
  pieceMassG: number | null;
  /** Share of the plating worn away, 0 … 1. */
  wear: number | null;
  /** A laboratory's result for this line: grade in g/t with the relative sd of laboratory and sampling together. */
  assay: { gradeGPerT: number; relativeSd: number } | null;
}

export interface LotInput {
  lines: LineInput[];
}

/** Quantiles by probability in per cent: `p05` is the 5 % quantile; type 7 (linear interpolation). */
export interface Quantiles {
  p0_15: number;
  p01: number;
  p05: number;
  p10: number;
  p25: number;
  p50: number;
  p75: number;
  p90: number;
  p95: number;
  p99: number;
  p99_5: number;
  p99_85: number;
}

export interface Spread {
  mean: number;
  sd: number;
  quantiles: Quantiles;
}

export interface Driver {
  /** Line the parameter belongs to; null when lines of one class share it. */
  lineId: string | null;
  classCode: string;
  /** Stable key such as `plating.thicknessUm` or `massG`. */
  parameter: string;
  /** First-order share of the variance, 0 … 1. */
  share: number;
  /** What to measure, as a sentence without full stop: "Measure the plating on line 2". */
  question: string;
  /** p10 and p90 of the lot's gold, grams, now and expected after the measurement. */
  nowG: [number, number];
  afterG: [number, number];
}

export interface Warning {
  code: string;
  lineId: string | null;
  message: string;
}

export interface LineEstimate {
  id: string;
  classCode: string;
  /** Middle of the line's net mass in grams, given or implied by the pieces. */
  massG: number;
  pieces: number | null;
  goldG: Spread;
  gradeGPerT: Quantiles;
  /** Share of the lot's variance that comes from this line, 0 … 1. */
  varianceShare: number;
  components: { name: string; goldG: Spread }[];
}

/** The computed distribution of contained gold of a lot. Plain JSON: stored as is, reproducible from input, catalogue version, seed and draws. */
export interface Estimate {
  modelVersion: string;
  catalogueVersion: string;
  seed: number;
  draws: number;
  massG: number;
  goldG: Spread;
  gradeGPerT: Quantiles;
  /** The 50 quantiles (i − 0.5)/50 of gold in grams, ascending. */
  beadsG: number[];
  /** Probability density per gram on equal bins from `fromG` to `toG`. */
  density: { fromG: number; toG: number; perG: number[] };
  lines: LineEstimate[];
  /** Largest share first. */
  drivers: Driver[];
  warnings: Warning[];
}
