const bucketBits = 13;
const buckets = 2 ** bucketBits;

/** Quantiles of values in any order, one for each probability 0 … 1, by linear interpolation (type 7). */
export type FindQuantiles = (values: Float64Array, probabilities: readonly number[]) => number[];

/**
 * Finds quantiles of many arrays of one length without sorting them: values are counted into buckets that keep their order, and
 * only the few buckets that hold a wanted rank are sorted. About ten times as fast as the library's sort.
 */
export function createQuantileFinder(length: number): FindQuantiles {
  // Fresh memory for each array would cost as much as the work on it.
  const keys = new Uint16Array(length);
  const counts = new Int32Array(buckets);
  const next = new Int32Array(buckets);
  const gathered = new Float64Array(length);
  return (values, probabilities) => {
    counts.fill(0);
    countKeys(keys, counts, values);
    const { places, runs } = locate(ranksOf(probabilities, length), counts, next);
    for (let i = 0; i < length; i += 1) {
      const at = next[keys[i] as number] as number;
      if (at < 0) continue;
      gathered[at] = values[i] as number;
      next[keys[i] as number] = at + 1;
    }
    for (const [from, to] of runs) gathered.subarray(from, to).sort();
    const valueAt = (rank: number) => gathered[places.get(rank) as number] as number;
    return probabilities.map((probability) => interpolate(valueAt, probability, length));
  };
}

/**
 * Type 7: R. J. Hyndman and Y. Fan, Sample quantiles in statistical packages, The American Statistician 50 (1996) 361–365.
 * @param valueAt the value of a rank, 0 for the smallest
 */
export function interpolate(valueAt: (rank: number) => number, probability: number, length: number): number {
  const position = (length - 1) * probability;
  const below = Math.floor(position);
  const low = valueAt(below);
  return position === below ? low : low + (valueAt(below + 1) - low) * (position - below);
}

function ranksOf(probabilities: readonly number[], length: number): number[] {
  const ranks = new Set<number>();
  for (const probability of probabilities) {
    const position = (length - 1) * probability;
    ranks.add(Math.floor(position)).add(Math.ceil(position));
  }
  return [...ranks].sort((a, b) => a - b);
}

/** Gives each bucket that holds a wanted rank its run of the gathered values, and each rank its place there. */
function locate(ranks: readonly number[], counts: Int32Array, next: Int32Array) {
  const places = new Map<number, number>();
  const runs: [from: number, to: number][] = [];
  next.fill(-1);
  let [bucket, before, filled] = [0, 0, 0];
  for (const rank of ranks) {
    while (before + (counts[bucket] as number) <= rank) {
      before += counts[bucket] as number;
      bucket += 1;
    }
    if (next[bucket] === -1) {
      next[bucket] = filled;
      runs.push([filled, filled + (counts[bucket] as number)]);
      filled += counts[bucket] as number;
    }
    places.set(rank, (next[bucket] as number) + rank - before);
  }
  return { places, runs };
}

/**
 * Gives each value a bucket that never falls when the value rises, and counts them. Where values span much, by the leading bits
 * of the numbers, which grow with their logarithm: draws of products of lognormals fill such buckets evenly.
 */
function countKeys(keys: Uint16Array, counts: Int32Array, values: Float64Array): void {
  const [least, most] = limits(values);
  if (least < 0 || most < 4 * least || most === least) countEvenly(keys, counts, values, least, most);
  else countByLeadingBits(keys, counts, values, least, most);
}

function countEvenly(keys: Uint16Array, counts: Int32Array, values: Float64Array, least: number, most: number): void {
  const scale = most === least ? 0 : (buckets - 1) / (most - least);
  for (let i = 0; i < values.length; i += 1) {
    const key = (((values[i] as number) - least) * scale) | 0;
    keys[i] = key;
    counts[key] = (counts[key] as number) + 1;
  }
}

function countByLeadingBits(
  keys: Uint16Array,
  counts: Int32Array,
  values: Float64Array,
  least: number,
  most: number,
): void {
  const bits = new Int32Array(values.buffer, values.byteOffset, 2 * values.length);
  const from = leadingBits(least);
  const shift = Math.max(0, 32 - Math.clz32(leadingBits(most) - from) - bucketBits);
  for (let i = 0, at = littleEndian ? 1 : 0; i < values.length; i += 1, at += 2) {
    // No value here is negative but −0, whose sign is taken off.
    const key = (((bits[at] as number) & withoutSign) - from) >> shift;
    keys[i] = key;
    counts[key] = (counts[key] as number) + 1;
  }
}

function limits(values: Float64Array): [least: number, most: number] {
  let [least, most] = [Infinity, -Infinity];
  for (let i = 0; i < values.length; i += 1) {
    const value = values[i] as number;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  return [least, most];
}

const withoutSign = 0x7fffffff;
const littleEndian = new Uint8Array(new Uint16Array([1]).buffer)[0] === 1;

function leadingBits(value: number): number {
  return new DataView(new Float64Array([value]).buffer).getInt32(littleEndian ? 4 : 0, littleEndian) & withoutSign;
}
