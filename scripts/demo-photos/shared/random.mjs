/**
 * A repeatable source of chance: the same seed always draws the same picture.
 * @param {number} seed any whole number
 */
export function createRandom(seed) {
  let state = seed | 0;
  const unit = () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const between = (low, high) => low + unit() * (high - low);
  return {
    unit,
    between,
    /** Evenly within `spread` either side of `centre`. */
    around: (centre, spread) => between(centre - spread, centre + spread),
    /** Bell-shaped, from -1 to 1, most often near 0. */
    bell: () => ((unit() + unit() + unit()) / 3) * 2 - 1,
    whole: (low, high) => Math.floor(between(low, high + 1)),
    pick: (list) => list[Math.floor(unit() * list.length)],
    chance: (share) => unit() < share,
  };
}
