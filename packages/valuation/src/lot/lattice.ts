/**
 * A rank-1 lattice: draw i of coordinate j is ((i · generator_j + shift_j) mod draws + ½) / draws. Each coordinate takes every
 * one of its `draws` equally likely values once, and any two coordinates are well spread against each other.
 * Source: C. Lemieux, Monte Carlo and Quasi-Monte Carlo Sampling, 2009, ch. 5 (rank-1 lattices, random shifts, dual lattice).
 */
export interface Column {
  generator: number;
  shift: number;
}

/** How many earlier coordinates a new one is checked against; lots of any size stay quick. */
const lookBack = 96;
/** Least length of the shortest dual vector, as a share of √draws; about 1.07 is the best possible. */
const wantedLength = 0.2;
const triesBeforeYielding = 60;

/** Coordinate number `index` for a seed; the generators do not depend on the seed, the shifts do. */
export function createLattice(seed: number, draws: number): (index: number) => Column {
  const generators = generatorsFor(draws);
  return (index) => {
    while (generators.length <= index) generators.push(nextGenerator(generators, draws));
    return { generator: generators[index] as number, shift: Math.floor((hash(seed, index) / 2 ** 32) * draws) };
  };
}

// Choosing generators is pure but slow beside a simulation, so each size is chosen once.
const chosen = new Map<number, number[]>();
function generatorsFor(draws: number): number[] {
  const known = chosen.get(draws) ?? [1];
  chosen.set(draws, known);
  return known;
}

function nextGenerator(earlier: readonly number[], draws: number): number {
  const recent = earlier.slice(-lookBack);
  let wanted = (wantedLength * Math.sqrt(draws)) ** 2;
  for (let attempt = 1; ; attempt += 1) {
    if (attempt % triesBeforeYielding === 0) wanted *= 0.7;
    const candidate = 1 + (hash(earlier.length, attempt) % (draws - 1));
    if (greatestCommonDivisor(candidate, draws) !== 1) continue;
    if (recent.every((other) => shortestDualSquared(other, candidate, draws) >= wanted)) return candidate;
  }
}

/** Squared length of the shortest (h, k) ≠ 0 with h·a + k·b ≡ 0 (mod n), for a and b coprime to n: Gauss's reduction. */
export function shortestDualSquared(a: number, b: number, n: number): number {
  // Multiples of the basis (n, 0) and (−b/a mod n, 1).
  let [shortX, shortY, longX, longY] = [((n - inverse(a, n)) * b) % n, 1, n, 0];
  for (;;) {
    const shortSquared = shortX * shortX + shortY * shortY;
    const steps = Math.round((longX * shortX + longY * shortY) / shortSquared);
    const [restX, restY] = [longX - steps * shortX, longY - steps * shortY];
    if (restX * restX + restY * restY >= shortSquared) return shortSquared;
    [longX, longY, shortX, shortY] = [shortX, shortY, restX, restY];
  }
}

function inverse(value: number, modulus: number): number {
  let [oldRest, rest, oldFactor, newFactor] = [value, modulus, 1, 0];
  while (rest !== 0) {
    const quotient = Math.floor(oldRest / rest);
    [oldRest, rest] = [rest, oldRest - quotient * rest];
    [oldFactor, newFactor] = [newFactor, oldFactor - quotient * newFactor];
  }
  return ((oldFactor % modulus) + modulus) % modulus;
}

function greatestCommonDivisor(a: number, b: number): number {
  return b === 0 ? a : greatestCommonDivisor(b, a % b);
}

/** Counter-based random bits: a 32-bit integer from two. Source: C. Wellons' integer hash "lowbias32". */
export function hash(seed: number, counter: number): number {
  return scramble((scramble(seed) + Math.imul(counter + 1, 0x9e3779b9)) >>> 0);
}

function scramble(value: number): number {
  let x = value >>> 0;
  x = Math.imul(x ^ (x >>> 16), 0x7feb352d);
  x = Math.imul(x ^ (x >>> 15), 0x846ca68b);
  return (x ^ (x >>> 16)) >>> 0;
}
