/** A bucket this full means the keys do not spread the values; the library's sort then does better. */
const fullestBucket = 48;

/**
 * A sorted copy of values that are not negative. Bucket sort on the leading bits of the numbers, which grow with their
 * logarithm, so that draws of products of lognormals fill the buckets evenly: about four times as fast as the library's sort.
 */
export function ascending(values: Float64Array): Float64Array {
  const { length } = values;
  const keys = bucketKeys(values);
  const ends = keys && countEnds(keys, length);
  if (!ends) return values.toSorted();
  const sorted = new Float64Array(length);
  for (let i = length - 1; i >= 0; i -= 1) {
    const key = keys[i] as number;
    const to = (ends[key] as number) - 1;
    ends[key] = to;
    sorted[to] = values[i] as number;
  }
  insertionSort(sorted);
  return sorted;
}

/** For each value a bucket number that never falls when the value rises; null when they would all share one or one is negative. */
function bucketKeys(values: Float64Array): Int32Array | null {
  const { length } = values;
  const [least, most] = limits(values);
  if (!(most > least && least >= 0)) return null;
  const keys = new Int32Array(length);
  if (most < 4 * least) {
    const scale = (length - 1) / (most - least);
    for (let i = 0; i < length; i += 1) keys[i] = ((values[i] as number) - least) * scale;
    return keys;
  }
  const bits = new Int32Array(values.buffer, values.byteOffset, 2 * length);
  const leading = littleEndian ? 1 : 0;
  const from = leadingBits(least);
  const scale = (length - 1) / (leadingBits(most) - from);
  for (let i = 0; i < length; i += 1) keys[i] = ((bits[2 * i + leading] as number) - from) * scale;
  return keys;
}

/** Where each bucket ends in the sorted array; null when one of them is too full. */
function countEnds(keys: Int32Array, length: number): Int32Array | null {
  const ends = new Int32Array(length);
  for (let i = 0; i < length; i += 1) ends[keys[i] as number] = (ends[keys[i] as number] as number) + 1;
  let total = 0;
  for (let i = 0; i < length; i += 1) {
    const count = ends[i] as number;
    if (count > fullestBucket) return null;
    total += count;
    ends[i] = total;
  }
  return ends;
}

/** Quick here, since no value is further from its place than its bucket is wide. */
function insertionSort(sorted: Float64Array): void {
  for (let i = 1; i < sorted.length; i += 1) {
    const value = sorted[i] as number;
    let at = i;
    while (at > 0 && (sorted[at - 1] as number) > value) {
      sorted[at] = sorted[at - 1] as number;
      at -= 1;
    }
    sorted[at] = value;
  }
}

function limits(values: Float64Array): [number, number] {
  let [least, most] = [Infinity, -Infinity];
  for (let i = 0; i < values.length; i += 1) {
    const value = values[i] as number;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  return [least, most];
}

const littleEndian = new Uint8Array(new Uint16Array([1]).buffer)[0] === 1;

function leadingBits(value: number): number {
  return new DataView(new Float64Array([value]).buffer).getInt32(littleEndian ? 4 : 0, littleEndian);
}
