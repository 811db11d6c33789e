const sqrtTwoPi = Math.sqrt(2 * Math.PI);

/** Density of the standard normal distribution. */
export function normalDensity(z: number): number {
  return Math.exp((-z * z) / 2) / sqrtTwoPi;
}

/**
 * Probability that a standard normal is at most z, to about 15 digits.
 * Source: Hart's algorithm 5666 as given in G. West, Better approximations to cumulative normal functions, 2005.
 */
export function normalProbability(z: number): number {
  const x = Math.abs(z);
  if (x > 37) return z > 0 ? 1 : 0;
  const tail = upperTail(x);
  return z > 0 ? 1 - tail : tail;
}

function upperTail(x: number): number {
  const e = Math.exp((-x * x) / 2);
  if (x >= 7.07106781186547) return e / (x + 1 / (x + 2 / (x + 3 / (x + 4 / (x + 0.65))))) / sqrtTwoPi;
  const above = polynomial(
    x,
    [
      220.206867912376, 221.213596169931, 112.079291497871, 33.912866078383, 6.37396220353165, 0.700383064443688,
      3.52624965998911e-2,
    ],
  );
  const below = polynomial(
    x,
    [
      440.413735824752, 793.826512519948, 637.333633378831, 296.564248779674, 86.7807322029461, 16.064177579207,
      1.75566716318264, 8.83883476483184e-2,
    ],
  );
  return (e * above) / below;
}

/**
 * The z below which a standard normal falls with the given probability, to about 16 digits.
 * @throws {RangeError} when the probability is not strictly between 0 and 1
 * Source: M. J. Wichura, algorithm AS 241 (PPND16), Applied Statistics 37 (1988) 477–484.
 */
export function normalQuantile(probability: number): number {
  if (!(probability > 0 && probability < 1))
    throw new RangeError(`probability must be between 0 and 1: ${probability}`);
  const q = probability - 0.5;
  if (Math.abs(q) <= 0.425) {
    const r = 0.180625 - q * q;
    return (q * polynomial(r, centreAbove)) / polynomial(r, centreBelow);
  }
  const r = Math.sqrt(-Math.log(q < 0 ? probability : 1 - probability));
  const z =
    r <= 5
      ? polynomial(r - 1.6, shoulderAbove) / polynomial(r - 1.6, shoulderBelow)
      : polynomial(r - 5, tailAbove) / polynomial(r - 5, tailBelow);
  return q < 0 ? -z : z;
}

/** Horner's rule; coefficients from the constant term upwards. */
function polynomial(x: number, coefficients: readonly number[]): number {
  return coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
}

const centreAbove = [
  3.387132872796366608, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125, 45921.953931549871457,
  67265.770927008700853, 33430.575583588128105, 2509.0809287301226727,
];
const centreBelow = [
  1, 42.313330701600911252, 687.1870074920579083, 5394.1960214247511077, 21213.794301586595867, 39307.89580009271061,
  28729.085735721942674, 5226.495278852854561,
];
const shoulderAbove = [
  1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504, 1.27045825245236838258,
  0.24178072517745061177, 0.0227238449892691845833, 7.7454501427834140764e-4,
];
const shoulderBelow = [
  1, 2.05319162663775882187, 1.6763848301838038494, 0.68976733498510000455, 0.14810397642748007459,
  0.0151986665636164571966, 5.475938084995344946e-4, 1.05075007164441684324e-9,
];
const tailAbove = [
  6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 0.29656057182850489123, 0.026532189526576123093,
  0.0012426609473880784386, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
];
const tailBelow = [
  1, 0.59983220655588793769, 0.13692988092273580531, 0.0148753612908506148525, 7.868691311456132591e-4,
  1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15,
];
